import "server-only";

const devices: [RegExp, string][] = [
  [/iPad|Tablet|Android(?!.*Mobile)/, "A tablet"],
  [/Mobi|iPhone|Android/, "A phone"],
  [/Windows|Macintosh|Linux|X11|CrOS/, "A computer"],
];

/** A device in words, from what its browser says of itself. */
export function deviceWords(userAgent: string): string {
  return devices.find(([pattern]) => pattern.test(userAgent))?.[1] ?? "A device we do not know";
}
