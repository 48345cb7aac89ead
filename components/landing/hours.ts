import type { Night } from "./LandingBuild";

/** The beam of hours: an evening, in minutes from midnight, a notch to each quarter of an hour. */
export const FIRST_HOUR = 18 * 60;
export const LAST_HOUR = 24 * 60;
export const QUARTER = 15;
export const DEFAULT_HOUR = 23 * 60;

const DAY = 24 * 60;

/** "23:00"; midnight at the end of the evening is "24:00". */
export function clockWords(minutes: number): string {
  const [hours, rest] = [Math.floor(minutes / 60), minutes % 60];
  return `${`${hours}`.padStart(2, "0")}:${`${rest}`.padStart(2, "0")}`;
}

export function holdsAt({ from, to }: Night, minutes: number): boolean {
  const clock = minutes % DAY;
  return from <= to ? clock >= from && clock < to : clock >= from || clock < to;
}

/** The next notch of the beam; what is not an hour of it is the default. */
export function readHour(text: string | undefined): number {
  const [, hours, minutes] = /^(\d{2}):(\d{2})$/.exec(text ?? "") ?? [];
  if (hours === undefined) return DEFAULT_HOUR;
  const asked = Number(hours) * 60 + Number(minutes);
  return asked < FIRST_HOUR || asked > LAST_HOUR ? DEFAULT_HOUR : Math.round(asked / QUARTER) * QUARTER;
}
