import type { Plan } from "../../lib/noise/plan";
import { marginWords, percent, type State } from "../format";
import { placeLabel, type Box } from "../verdict/placeLabels";
import type { Verdict } from "../../lib/noise/verdict";
import { LISTENER } from "./PlanMarks";
import { fitted, textWidth, type PlanScale } from "./planScale";
import type { Ribbon } from "./sheaf";
import { outdoorSources } from "./things";

export interface PlacedLabel {
  key: string;
  x: number;
  y: number;
  words: string;
  /** Second line: the verdict of a listener, with its state. */
  under?: { words: string; state: State };
}

interface Wanted {
  key: string;
  words: string;
  under?: PlacedLabel["under"];
  anchor: { x: number; y: number };
  needed: boolean;
}

const SIZE = 13;
const LINE = 17;
const NEAR = 170;
const LONGEST = 190;
/** A share under this is drawn and listed, but not named on the plan. */
const NAMED_SHARE = 0.03;

interface Drawn {
  plan: Plan;
  verdict: Verdict;
  scale: PlanScale;
  ribbons: readonly Ribbon[];
  /** On the phone only the lit listener is named. */
  few: boolean;
  listenerId: string | null;
  taken: readonly Box[];
}

function wantedLabels({ plan, verdict, scale, ribbons, few, listenerId }: Drawn): Wanted[] {
  const anchorOf = (position: readonly number[]) => {
    const [x, y] = scale.at(position);
    return { x, y };
  };
  const listeners = plan.receivers.flatMap(({ id, name, position }): Wanted[] => {
    if (!position) return [];
    const judged = verdict.receivers.find(({ receiverId }) => receiverId === id);
    const state = judged?.state ?? "not weighed";
    return [{ key: id, words: name, under: { words: marginWords(state, judged?.margin ?? undefined), state }, anchor: anchorOf(position), needed: true }];
  });
  if (few) return listeners.filter(({ key }) => key === listenerId);
  const ways = ribbons
    .filter(({ way }) => way.share >= NAMED_SHARE)
    .map(({ way, middle }): Wanted => {
      const [x, y] = middle[3]!;
      return { key: `way ${way.id}`, words: `${way.name}, ${percent(way.share)}`, anchor: { x, y }, needed: false };
    });
  const named = new Set(ribbons.filter(({ way }) => way.share >= NAMED_SHARE).map(({ way }) => way.partId));
  const outdoors = outdoorSources(plan)
    .filter(({ id, position }) => position !== null && !named.has(id))
    .map(({ id, name, position }): Wanted => ({ key: id, words: name, anchor: anchorOf(position!), needed: false }));
  return [...listeners, ...ways, ...outdoors];
}

function sizeOf({ words, under }: Wanted): { width: number; height: number } {
  return { width: Math.max(textWidth(words, SIZE), textWidth(under?.words ?? "", SIZE)) + 4, height: under ? 2 * LINE : LINE };
}

/** Where each label stands: near what it names, over nothing else. What finds no place is left to the lists beside the plan. */
export function placeLabels(drawn: Drawn): PlacedLabel[] {
  const { scale } = drawn;
  const taken = [...drawn.taken];
  return wantedLabels(drawn).flatMap((wanted): PlacedLabel[] => {
    const label = { ...wanted, words: fitted(wanted.words, SIZE, LONGEST) };
    const { x, y } = label.anchor;
    const room: Box = {
      left: Math.max(scale.left + 4, x - NEAR),
      top: Math.max(scale.top + 4, y - NEAR),
      right: Math.min(scale.right - 4, x + NEAR),
      bottom: Math.min(scale.bottom - 4, y + NEAR),
    };
    const box = placeLabel({ ...sizeOf(label), anchor: label.anchor }, taken, room);
    if (!box) return [];
    taken.push(box);
    return [{ key: label.key, words: label.words, under: label.under, x: box.left, y: box.top + 13 }];
  });
}

const around = ([x, y]: readonly [number, number], half: number): Box => ({ left: x - half, top: y - half, right: x + half, bottom: y + half });

/** What labels must not cover. */
export function takenBoxes({ plan, scale, ribbons }: { plan: Plan; scale: PlanScale; ribbons: readonly Ribbon[] }): Box[] {
  const marks = [...plan.receivers, ...outdoorSources(plan)].flatMap(({ position }) => (position ? [around(scale.at(position), LISTENER / 2 + 4)] : []));
  const bands = ribbons.flatMap(({ middle, width }) => middle.map((point) => around([point[0], point[1]], width / 2 + 2)));
  const north: Box = { left: scale.right - 44, top: scale.top, right: scale.right, bottom: scale.top + 54 };
  return [...marks, ...bands, north];
}
