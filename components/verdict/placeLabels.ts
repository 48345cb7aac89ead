/** A box on the chart: left, top, right, bottom. */
export interface Box {
  left: number;
  top: number;
  right: number;
  bottom: number;
}

export interface Label {
  width: number;
  height: number;
  /** What the label speaks of. */
  anchor: { x: number; y: number };
}

const STEP = 6;

export function overlaps(one: Box, other: Box): boolean {
  return one.left < other.right && other.left < one.right && one.top < other.bottom && other.top < one.bottom;
}

function boxAt(label: Label, left: number, top: number): Box {
  return { left, top, right: left + label.width, bottom: top + label.height };
}

/** Up and to the right of its anchor is where a label reads best; every pixel away from there costs. */
function costOf(box: Box, { anchor, height }: Label): number {
  const aside = Math.abs(box.left - (anchor.x + 10));
  const above = Math.abs(box.bottom - (anchor.y - 14));
  return aside + above + (box.top + height > anchor.y ? 24 : 0);
}

/** The nearest place inside `room` where the label covers none of the taken boxes; null where there is none. */
export function placeLabel(label: Label, taken: readonly Box[], room: Box): Box | null {
  let best: Box | null = null;
  for (let top = room.top; top + label.height <= room.bottom; top += STEP) {
    for (let left = room.left; left + label.width <= room.right; left += STEP) {
      const box = boxAt(label, left, top);
      if (best && costOf(box, label) >= costOf(best, label)) continue;
      if (!taken.some((other) => overlaps(box, other))) best = box;
    }
  }
  return best;
}
