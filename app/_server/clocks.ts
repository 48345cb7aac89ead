import "server-only";

interface Choice {
  value: string;
  label: string;
}

/** A clock by its name, as "UTC" or "Area/Place"; an offset from another clock is none, for it knows no summer. */
export function isTimeZone(zone: string): boolean {
  if (!/^[A-Za-z][\w+\-/]*$/.test(zone)) return false;
  try {
    return new Intl.DateTimeFormat("en", { timeZone: zone }).format(0).length > 0;
  } catch {
    return false;
  }
}

export const isCurrency = (code: string): boolean => Intl.supportedValuesOf("currency").includes(code);

/** Clocks to choose from. */
export function clockChoices(): Choice[] {
  const zones = new Set(["UTC", ...Intl.supportedValuesOf("timeZone")]);
  return [...zones].map((zone) => ({ value: zone, label: zone.replaceAll("_", " ") }));
}

/** Currencies to choose from, each with its name. */
export function currencyChoices(): Choice[] {
  const names = new Intl.DisplayNames("en", { type: "currency" });
  return Intl.supportedValuesOf("currency").map((code) => ({ value: code, label: `${code}, ${names.of(code) ?? code}` }));
}
