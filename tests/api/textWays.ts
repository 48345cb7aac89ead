import { expect } from "vitest";
import { POST as CHANGES } from "../../app/api/projects/[projectId]/changes/route";
import { PATCH as PROJECT } from "../../app/api/projects/[projectId]/route";
import type { Answer } from "../../app/_server/weigh";
import { ask } from "../build";
import { injectionStrings } from "../injections";
import { buildStage, type Stage } from "./actors";

type Values = Record<string, unknown>;
type Way = readonly (string | number)[];

/** A field that takes free words: of which part, and the way to it inside the part. */
export interface TextField {
  part: string;
  id: string;
  way: Way;
}

const lists = ["buildings", "spaces", "surfaces", "sources", "outlets", "incidences", "paths", "constructions", "elements", "fences", "receivers", "criteria", "situations"] as const;

let stage: Stage;
let fields: TextField[];
let last: Answer["plan"] | undefined;

/** A yard of one's own and the fields of it that keep a text. */
export async function openTextFields(): Promise<readonly TextField[]> {
  stage = await buildStage();
  fields = await findTextFields();
  return fields;
}

async function change(changes: object[]) {
  const { revision } = await stage.project.reload();
  return ask(CHANGES, { method: "POST", cookie: stage.cookies.owner, params: { projectId: stage.project.id }, revision, body: { changes } });
}

/** Every way to a text inside a value. */
function waysToTexts(value: unknown, way: Way = []): Way[] {
  if (typeof value === "string") return [way];
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([field, inner]) => waysToTexts(inner, [...way, Array.isArray(value) ? Number(field) : field]));
}

const at = (value: unknown, way: Way): unknown => way.reduce<unknown>((inner, step) => (inner as Values)[step], value);

function withText(value: unknown, [step, ...rest]: Way, text: string): unknown {
  if (step === undefined) return text;
  if (Array.isArray(value)) return value.map((one: unknown, place) => (place === step ? withText(one, rest, text) : one));
  return { ...(value as Values), [step]: withText((value as Values)[step], rest, text) };
}

/** The field at the top of a part is what a patch replaces. */
function patchOf(part: Values, way: Way, text: string): Values {
  const top = String(way[0]);
  return { [top]: (withText(part, way, text) as Values)[top] };
}

const longest = injectionStrings().reduce((one, other) => (other.length > one.length ? other : one));

/** Asks which fields keep a text that is no key, no choice and no date. */
async function findTextFields(): Promise<TextField[]> {
  const found: TextField[] = [];
  for (const part of lists) {
    for (const one of stage.plan[part].slice(0, 3)) {
      for (const way of waysToTexts(one).filter(([top]) => top !== "id")) {
        const seen = found.some((field) => field.part === part && field.way.join() === way.join());
        const takes = seen ? false : (await change([{ act: "change", part, id: one.id, patch: patchOf(one as Values, way, "x".repeat(longest.length)) }])).status === 200;
        if (takes) found.push({ part, id: one.id, way });
      }
    }
  }
  return found;
}

async function lastPlan(): Promise<Answer["plan"]> {
  if (last) return structuredClone(last);
  const answer = await change([{ act: "change", part: "receivers", id: stage.plan.receivers[0]!.id, patch: {} }]);
  return ((await answer.json()) as Answer).plan;
}

/** Writes another text into every field at once, this turn's, and reads each back. As many turns as texts: each in every field. */
export async function expectKept(turn: number): Promise<void> {
  const texts = injectionStrings();
  const textOf = (place: number) => texts[(turn + place) % texts.length]!;
  const plan = (await lastPlan()) as unknown as Record<string, Values[]>;
  const partOf = ({ part, id }: TextField) => plan[part]!.find((one) => one.id === id)!;
  // One field after the other into the same part, so that no patch undoes the one before.
  const changes = fields.map((field, place) => {
    const patch = patchOf(partOf(field), field.way, textOf(place));
    Object.assign(partOf(field), patch);
    return { act: "change", part: field.part, id: field.id, patch };
  });
  const answer = await change(changes);
  expect(answer.status, `turn ${turn}`).toBe(200);
  last = ((await answer.json()) as Answer).plan;
  const kept = last as unknown as Record<string, Values[]>;
  fields.forEach(({ part, id, way }, place) => {
    expect(at(kept[part]!.find((one) => one.id === id), way), `${part} ${way.join(".")}`).toBe(textOf(place));
  });
}

/** The same for the yard's own name and words. */
export async function expectYardKept(name: string, says: string): Promise<void> {
  const { revision } = await stage.project.reload();
  const answer = await ask(PROJECT, { method: "PATCH", cookie: stage.cookies.owner, params: { projectId: stage.project.id }, revision, body: { name, says } });
  expect(answer.status, name).toBe(200);
  const kept = await stage.project.reload();
  expect({ name: kept.name, says: kept.says }).toEqual({ name: name.trim(), says: says.trim() });
}
