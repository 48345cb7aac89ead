import type { Plan } from "../../lib/noise/plan";
import { budgetAddress, yardAddress } from "../addresses";
import type { Answer } from "../state/plan";
import type { DrawnBuilding, Point, ProjectLine } from "./ProjectLine";

interface Listed {
  project: { id: string; name: string; says: string; stage: string; archived: boolean };
  changedAt: Date;
  may: ProjectLine["may"];
  people: { name: string; role: string; you: boolean }[];
  answer: Answer;
}

/** A yard as its line in the list: the plan to draw, the worst listener, who is at work on it. */
export function projectLineOf({ project, changedAt, may, people, answer: { revision, plan, verdict } }: Listed): ProjectLine {
  const worst = verdict.receivers.find(({ receiverId }) => receiverId === verdict.leadingReceiverId);
  const receiver = plan.receivers.find(({ id }) => id === worst?.receiverId);
  const { id, name, says, stage, archived } = project;
  return {
    ...{ id, name, says, archived, may, revision },
    href: budgetAddress(id),
    yardHref: yardAddress(id),
    changedAt: changedAt.toISOString(),
    stage: stage || stageOf(plan),
    lot: plan.lot.outline ?? [],
    buildings: plan.buildings.flatMap(drawn),
    listener: receiver && placeOf(plan, receiver),
    listenerName: receiver?.name,
    state: worst?.state ?? "not weighed",
    margin: worst?.margin ?? undefined,
    doubt: worst?.doubt,
    band: worst?.band,
    weighedAt: worst ? changedAt.toISOString() : undefined,
    people: people.map(({ name: who, role, you }) => ({ name: who, says: role === "owner" ? (you ? "yours" : "owner") : role })),
  };
}

/** Where a yard stands, where nobody has said so. */
function stageOf({ lot, buildings, receivers }: Plan): string {
  if (receivers.length > 0) return "As drawn";
  return lot.outline || buildings.length > 0 ? "Yard drawn" : "Nothing drawn yet";
}

function drawn({ footprint, role }: Plan["buildings"][number]): DrawnBuilding[] {
  if (!footprint) return [];
  const kind = role === "studio" ? "studio" : role === "other" ? "other" : "house";
  return [{ outline: footprint, kind }];
}

/** Where a listener stands: given, or the middle of the room they are in. */
function placeOf(plan: Plan, { position, spaceId }: Plan["receivers"][number]): Point | undefined {
  if (position) return [position[0], position[1]];
  const box = plan.spaces.find(({ id }) => id === spaceId)?.box;
  return box ? [box.at[0] + box.size[0] / 2, box.at[1] + box.size[1] / 2] : undefined;
}
