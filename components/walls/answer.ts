import { OCTAVE_BANDS, FIRST_JUDGED } from "../../lib/noise/bands";
import type { PathVerdict, ReceiverVerdict } from "../../lib/noise/verdict";
import type { State } from "../format";
import type { Answer } from "../state/plan";

/** The listener that leads the page, as the strip and the list need it. */
export interface Lead {
  receiver: ReceiverVerdict;
  name: string;
  state: State;
  /** Index of the band that decides; the lowest judged band where none is weighed. */
  bandIndex: number;
}

export function leadOf({ plan, verdict }: Answer): Lead | undefined {
  const receiver = verdict.receivers.find(({ receiverId }) => receiverId === verdict.leadingReceiverId);
  if (!receiver) return undefined;
  return {
    receiver,
    name: plan.receivers.find(({ id }) => id === receiver.receiverId)?.name ?? "The listener",
    state: receiver.state,
    bandIndex: receiver.band === null ? FIRST_JUDGED : OCTAVE_BANDS.indexOf(receiver.band),
  };
}

/** How far the margin of the same listener moved, dB, positive is better; null where one of the two was not weighed. */
export function movedBy(before: Answer, after: Answer): number | null {
  const lead = leadOf(after);
  const old = before.verdict.receivers.find(({ receiverId }) => receiverId === lead?.receiver.receiverId);
  if (!lead || old?.margin == null || lead.receiver.margin === null) return null;
  return lead.receiver.margin - old.margin;
}

/** Share of the deciding band, or of the weighted total where the limit is one number. */
const shareOf = ({ bandIndex }: Lead, path: PathVerdict) =>
  path.weighted?.share ?? path.shares[bandIndex] ?? 0;

/** The one path that carries most, with its share; what travels gathered names none. */
export function loudestPath(lead: Lead): { path: PathVerdict; share: number } | undefined {
  const single = lead.receiver.paths.filter(({ id }) => id !== "rest");
  const path = single.toSorted((one, two) => shareOf(lead, two) - shareOf(lead, one))[0];
  return path && shareOf(lead, path) > 0 ? { path, share: shareOf(lead, path) } : undefined;
}

/** Share of one element; undefined where no sound leaves by it. */
export function shareOfElement(lead: Lead, elementId: string): number | undefined {
  const path = lead.receiver.paths.find(({ partId }) => partId === elementId);
  return path && shareOf(lead, path);
}
