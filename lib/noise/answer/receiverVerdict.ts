import { OCTAVE_BANDS } from "../bands";
import { ncOf } from "../criteria";
import { crossCutOf } from "./crossCut";
import { doubtParts } from "./doubt";
import { factsOf } from "./facts";
import { levelOf } from "../levels";
import { hasBand } from "../model/masks";
import type { Field } from "../sound/field";
import type { SpreadFrom } from "../sound/unknowns";
import { toOut, type ReceiverVerdict } from "../verdict";
import { aWeighted, cWeighted } from "../weighting";
import { contributionsOf } from "./contributions";
import { pathVerdict, waysOf } from "./paths";
import { restsOn } from "./rests";
import { bandVerdicts, lowestVerdict, weightedVerdict, type Weighing } from "./weighing";

const LOWEST_NC = 15;

function ncVerdict(levels: Float64Array, edition: string | undefined): ReceiverVerdict["nc"] {
  const { value, band } = ncOf(levels, edition);
  if (Number.isNaN(value)) return { value: "unknown", band: null };
  if (value === Infinity) return { value: "above", band };
  return { value: value < LOWEST_NC ? "below" : value, band };
}

/** Everything the product says of one listener, of the weighing that leads. */
export function receiverVerdict(
  field: Field,
  weighing: Weighing,
  spread: SpreadFrom | null,
  most: number,
): ReceiverVerdict {
  const { criterion, playing, hearing, energy, unknown, state, margin, leading, doubt, parts } = weighing;
  const levels = energy.map((each, band) => (hasBand(unknown, band) ? NaN : levelOf(each)));
  const ways = waysOf(weighing);
  const rests = restsOn(weighing);
  return {
    receiverId: hearing.receiver.id,
    situationId: playing.situation?.id ?? null,
    criterionId: criterion?.id ?? null,
    metric: weighing.metric,
    state,
    margin: Number.isFinite(margin) ? margin : null,
    band: leading < 0 ? null : OCTAVE_BANDS[leading],
    doubt: Number.isFinite(doubt) ? doubt : null,
    unproven: (state === "tight" || state === "under") && rests.length > 0,
    restsOn: rests,
    lowest: lowestVerdict(weighing),
    bands: bandVerdicts(weighing),
    dba: toOut(aWeighted(levels)),
    dbc: toOut(cWeighted(levels)),
    nc: ncVerdict(levels, criterion?.metric === "NC" ? criterion.edition : undefined),
    weighted: weightedVerdict(weighing),
    paths: ways.map((way) => pathVerdict(weighing, way)),
    ...contributionsOf({ field, weighing, spread }, most),
    doubts: leading < 0 ? [] : doubtParts(parts, energy, leading),
    facts: factsOf(weighing, ways),
    crossCut: crossCutOf(field, weighing, ways, spread),
  };
}
