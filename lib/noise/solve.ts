import { receiverVerdict } from "./answer/receiverVerdict";
import { sourceVerdict } from "./answer/sourceVerdict";
import { weigh, type Weighing } from "./answer/weighing";
import { effectiveLoss, type EffectiveLoss } from "./effective";
import { levelOf } from "./levels";
import { hasBand } from "./model/masks";
import type { ElementPassing } from "./model/passing";
import type { RoomModel } from "./model/roomModels";
import type { Criterion, Plan, Receiver } from "./plan";
import { decayOf, statisticalFrom } from "./rooms";
import { fieldOf, type Field } from "./sound/field";
import { hear } from "./sound/hearing";
import { play, type Playing } from "./sound/playing";
import { hasUnknown, spreadsOf, type SpreadFrom } from "./sound/unknowns";
import { compareWeighed, leadingOf } from "./states";
import {
  toOutSpectrum,
  type ConstructionVerdict,
  type ElementVerdict,
  type Note,
  type ReceiverVerdict,
  type SpaceVerdict,
  type Verdict,
} from "./verdict";

/** Named in every verdict; a change of the arithmetic changes it. */
export const SOLVER = "solver 1";

/** Contributions listed per listener unless all are asked for; what is left out stands together as the rest. */
const MOST_CONTRIBUTIONS = 48;

export interface SolveOptions {
  /** Most contributions per listener; Infinity lists all. */
  readonly contributions?: number;
}

function constructionVerdict({
  loss,
  bases,
  surfaceMass,
  thickness,
  facts,
  laboratory,
}: EffectiveLoss): ConstructionVerdict {
  return {
    loss: toOutSpectrum(loss),
    bases: [...bases],
    surfaceMass,
    thickness,
    massAirMass: facts?.studResonance ?? facts?.massAirMass ?? null,
    coincidence: facts?.leaves.map(({ criticalFrequency }) => criticalFrequency) ?? [],
    laboratory,
  };
}

function elementVerdict(
  area: number,
  { passing, unknown, bases, deviations }: ElementPassing,
): ElementVerdict {
  const loss = passing.map((each, band) => (hasBand(unknown, band) ? NaN : -levelOf(each / area)));
  return { loss: toOutSpectrum(loss), bases: [...bases], doubts: Array.from(deviations) };
}

function spaceVerdict({ space: { volume }, absorption }: RoomModel): SpaceVerdict {
  const decay = absorption.map((area) => decayOf(volume, area));
  return {
    absorption: toOutSpectrum(absorption),
    decay: toOutSpectrum(decay),
    statisticalFrom: statisticalFrom(volume, decay),
  };
}

/** Every situation with every limit of a listener, reckoned once per situation and way of averaging. */
function weighingsOf(
  field: Field,
  receiver: Receiver,
  playings: (of: Criterion["averaging"]) => Playing[],
  spread: SpreadFrom | null,
): Weighing[] {
  const own = field.plan.criteria.filter(({ receiverId }) => receiverId === receiver.id);
  const criteria: (Criterion | null)[] = own.length > 0 ? own : [null];
  const hearing = hear(field, receiver, spread);
  return criteria.flatMap((criterion) =>
    playings(criterion?.averaging ?? "loudest").map((playing) => weigh(field, hearing, playing, criterion)),
  );
}

function playingsOf(field: Field): (averaging: Criterion["averaging"]) => Playing[] {
  const { situations } = field.plan;
  const kept = new Map<string, Playing[]>();
  return (averaging) => {
    const known =
      kept.get(averaging) ??
      (situations.length > 0 ? situations : [null]).map((situation) => play(field, situation, averaging));
    kept.set(averaging, known);
    return known;
  };
}

/** Without a limit the loudest situation leads. */
function leadingWeighing(weighings: readonly Weighing[]): Weighing | undefined {
  const loudness = ({ energy }: Weighing) => energy.reduce((sum, each) => sum + each, 0);
  if (weighings[0]?.criterion) return leadingOf(weighings);
  return weighings.reduce((lead, each) => (loudness(each) > loudness(lead) ? each : lead), weighings[0]);
}

/** The listener whose verdict leads the page; one without a limit only where nobody has one. */
function leadingReceiver(receivers: readonly ReceiverVerdict[]): string | null {
  const limited = receivers.filter(({ metric }) => metric !== "none");
  const weighed = (limited.length > 0 ? limited : receivers).map((verdict) => ({
    ...verdict,
    margin: verdict.margin ?? NaN,
  }));
  return weighed.sort(compareWeighed)[0]?.receiverId ?? null;
}

function recordOf<T, V>(all: Iterable<T>, keyed: (each: T) => [string, V]): Record<string, V> {
  return Object.fromEntries(Array.from(all, keyed));
}

/**
 * A plan's verdict: levels at every listener band by band, weighed against their limits, with every reason. Total: any
 * plan that its schema lets pass has a verdict; what is missing becomes a note and an unknown, never an exception.
 * Order of calculation: solver method 8.
 */
export function solve(plan: Plan, { contributions = MOST_CONTRIBUTIONS }: SolveOptions = {}): Verdict {
  const notes: Note[] = [];
  const losses = new Map(
    plan.constructions.map((construction) => [construction.id, effectiveLoss(construction)]),
  );
  const field = fieldOf(plan, losses, notes);
  const spread = hasUnknown(field) ? spreadsOf(field) : null;
  const playings = playingsOf(field);
  const receivers = plan.receivers.flatMap((receiver) => {
    const lead = leadingWeighing(weighingsOf(field, receiver, playings, spread));
    if (lead && !lead.hearing.placed)
      notes.push({ partId: receiver.id, text: `${receiver.name} has no place yet.` });
    return lead ? [receiverVerdict(field, lead, spread, contributions)] : [];
  });
  return {
    solver: SOLVER,
    leadingReceiverId: leadingReceiver(receivers),
    receivers,
    elements: recordOf(plan.elements, ({ id, area }) => [id, elementVerdict(area, field.passings.get(id)!)]),
    constructions: recordOf(losses, ([id, loss]) => [id, constructionVerdict(loss)]),
    spaces: recordOf(field.rooms, (room) => [room.space.id, spaceVerdict(room)]),
    sources: recordOf(field.sources, (model) => [model.source.id, sourceVerdict(field, model)]),
    notes,
  };
}
