const DAY = 24 * 60 * 60 * 1000;

function dayOf(moment: Date, timeZone: string): string {
  return new Intl.DateTimeFormat("en-CA", { timeZone, dateStyle: "short" }).format(moment);
}

function format(moment: Date, timeZone: string, options: Intl.DateTimeFormatOptions): string {
  return new Intl.DateTimeFormat("en-GB", { timeZone, ...options }).format(moment);
}

/** "today 21:04", "yesterday 16:40", "12 May", "12 May 2025": the clock of the yard decides what today is. */
export function momentWords(iso: string, now: string, timeZone: string): string {
  const moment = new Date(iso);
  const present = new Date(now);
  const clock = format(moment, timeZone, { hour: "2-digit", minute: "2-digit" });
  if (dayOf(moment, timeZone) === dayOf(present, timeZone)) return `today ${clock}`;
  if (dayOf(moment, timeZone) === dayOf(new Date(present.getTime() - DAY), timeZone)) return `yesterday ${clock}`;
  const sameYear = dayOf(moment, timeZone).slice(0, 4) === dayOf(present, timeZone).slice(0, 4);
  return format(moment, timeZone, { day: "numeric", month: "long", ...(sameYear ? {} : { year: "numeric" }) });
}
