/**
 * Places for labels that want to stand at `wanted` (ascending) but need `gap` between neighbours, kept within
 * [low, high]: labels that would touch form a group that stands around the mean of what its members wanted.
 */
export function spreadApart(wanted: readonly number[], gap: number, low: number, high: number): number[] {
  const groups: { sum: number; count: number }[] = [];
  wanted.forEach((place, index) => {
    groups.push({ sum: place - index * gap, count: 1 });
    while (groups.length > 1 && meanOf(groups.at(-2)!) > meanOf(groups.at(-1)!)) merge(groups);
  });
  const shifted = groups.flatMap((group) => Array<number>(group.count).fill(meanOf(group)));
  const room = high - (wanted.length - 1) * gap;
  return shifted.map((mean, index) => Math.max(low, Math.min(room, mean)) + index * gap);
}

const meanOf = (group: { sum: number; count: number }) => group.sum / group.count;

function merge(groups: { sum: number; count: number }[]) {
  const last = groups.pop()!;
  const before = groups.at(-1)!;
  before.sum += last.sum;
  before.count += last.count;
}
