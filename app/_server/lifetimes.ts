import "server-only";

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;
const DAY = 24 * HOUR;

/** Old id of a renewed session: answers already on their way still arrive. */
const GRACE = MINUTE;
const RENEWED_AFTER = DAY;
const SEEN_EVERY = MINUTE;
/** How long a password that was given again counts for what asks for it. */
const PROOF = 10 * MINUTE;

export interface Times {
  beganAt: Date;
  issuedAt: Date;
  seenAt: Date;
  replacedAt: Date | null;
  keep: boolean;
}

/** Team members reach every yard of the team: shorter, until there is a second factor. */
const lifetimes = {
  member: () => ({ idle: 4 * HOUR, whole: DAY }),
  guest: (keep: boolean) => ({ idle: keep ? 7 * DAY : 12 * HOUR, whole: 30 * DAY }),
};

/** Whether a session still holds at `now`, which is the database's time. */
export function isAlive({ beganAt, seenAt, replacedAt, keep }: Times, member: boolean, now: Date): boolean {
  const { idle, whole } = member ? lifetimes.member() : lifetimes.guest(keep);
  const since = (moment: Date) => now.getTime() - moment.getTime();
  return since(seenAt) <= idle && since(beganAt) <= whole && (replacedAt === null || since(replacedAt) <= GRACE);
}

export const isToRenew = ({ issuedAt, replacedAt }: Times, now: Date) =>
  replacedAt === null && now.getTime() - issuedAt.getTime() > RENEWED_AFTER;

export const isToMark = ({ seenAt }: Times, now: Date) => now.getTime() - seenAt.getTime() > SEEN_EVERY;

/** A replaced id proves nothing: what was given, was given under the new one. */
export const isProved = ({ provedAt, replacedAt }: Times & { provedAt: Date }, now: Date) =>
  replacedAt === null && now.getTime() - provedAt.getTime() <= PROOF;
