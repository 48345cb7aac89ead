import "server-only";
import { OCTAVE_BANDS } from "@/lib/noise/bands";
import type { Plan } from "@/lib/noise/plan";
import type { Note, ReceiverVerdict, Verdict } from "@/lib/noise/verdict";

/** The verdict where none can be given: every listener not weighed, and why. */
export function notWeighed(plan: Plan, notes: Note[]): Verdict {
  return {
    solver: "none",
    leadingReceiverId: plan.receivers[0]?.id ?? null,
    receivers: plan.receivers.map(({ id }) => unweighedReceiver(id)),
    elements: {},
    constructions: {},
    spaces: {},
    notes,
  };
}

function unweighedReceiver(receiverId: string): ReceiverVerdict {
  return {
    receiverId,
    situationId: null,
    criterionId: null,
    metric: "none",
    state: "not weighed",
    margin: null,
    band: null,
    doubt: null,
    unproven: false,
    restsOn: [],
    lowest: null,
    bands: OCTAVE_BANDS.map((band) => ({
      band,
      level: "unknown",
      known: "unknown",
      limit: null,
      margin: null,
      spent: null,
      doubt: 0,
      state: "not weighed",
    })),
    dba: "unknown",
    dbc: "unknown",
    nc: { value: "unknown", band: null },
    weighted: null,
    paths: [],
    contributions: [],
    rest: null,
    doubts: [],
    facts: { sourceId: null, voice: "", sourceShare: 0, leading: [], dropFirst: 0, dropFirstTwo: 0 },
    crossCut: null,
  };
}
