import type { PartKind, Plan } from "../lib/noise/plan";
import { Part } from "./Part";
import { PartFault } from "./PartFault";
import { linkedSources } from "./partLinks";
import type { PlanPart } from "./partRows";
import { partKinds, partTables, type Place } from "./partTables";
import { planOf } from "./planOf";
import type { Act } from "./Revision";

interface Placed {
  kind: PartKind;
  part: PlanPart;
}

/**
 * Removes a part and what belongs to it: a wall's elements, a listener's limits. What only uses it holds it, and the
 * refusal names the holders.
 */
export async function removePart({ projectId, transaction }: Place, kind: PartKind, id: string): Promise<Act[]> {
  const { word } = partTables[kind];
  if (kind === "lot") throw new PartFault("held", "The lot stays: a yard without ground cannot be drawn.");
  const parts = allParts(await planOf(projectId, transaction));
  const named = parts.find((one) => one.kind === kind && one.part.id === id);
  if (!named) throw new PartFault("missing", `There is no such ${word} here.`);
  const going = withOwned(named, parts);
  refuseHeld(going, parts);
  const before = parts.filter((one) => !going.includes(one) && namesOneOf(one, going));
  await Part.destroy({ where: { projectId, id: going.map(({ part }) => part.id) }, transaction });
  const after = await planOf(projectId, transaction);
  return [...going.map(removal), ...before.map((one) => changeOf(one, allParts(after)))];
}

function allParts(plan: Plan): Placed[] {
  return partKinds.flatMap((kind) => {
    const list = partTables[kind].list;
    // A part of a plan has the id that PlanPart asks for.
    return (list ? (plan[list] as PlanPart[]) : [plan.lot as PlanPart]).map((part) => ({ kind, part }));
  });
}

function withOwned(root: Placed, parts: readonly Placed[]): Placed[] {
  const going = [root];
  for (const owner of going) {
    going.push(...parts.filter((one) => !going.includes(one) && pointsAt(one, owner, true)));
  }
  return going;
}

function refuseHeld(going: readonly Placed[], parts: readonly Placed[]) {
  const holders = parts.filter((one) => !going.includes(one) && going.some((gone) => pointsAt(one, gone, false)));
  if (holders.length === 0) return;
  const names = holders.map(({ kind, part }) => String(part.name ?? partTables[kind].word));
  const shown = names.length > 4 ? [...names.slice(0, 3), `${names.length - 3} more`] : names;
  throw new PartFault("held", `Still in use: ${shown.join(", ")}. Change that first.`);
}

function pointsAt({ kind, part }: Placed, target: Placed, owned: boolean): boolean {
  return partTables[kind].references.some(
    (one) => one.owned === owned && one.to === target.kind && part[one.field] === target.part.id,
  );
}

const namesOneOf = ({ kind, part }: Placed, going: readonly Placed[]) =>
  linkedSources(kind, part).some(({ id }) => going.some((gone) => gone.part.id === id));

const removal = ({ kind, part }: Placed): Act => ({ kind, id: part.id, act: "remove", before: part, after: null });

function changeOf({ kind, part }: Placed, later: readonly Placed[]): Act {
  const after = later.find((one) => one.part.id === part.id)?.part ?? null;
  return { kind, id: part.id, act: "change", before: part, after };
}
