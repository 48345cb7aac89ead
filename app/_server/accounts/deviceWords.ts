import "server-only";

const browsers: [RegExp, string][] = [
  [/Firefox\/|FxiOS\//, "Firefox"],
  [/Edg[A-Za-z]*\//, "Edge"],
  [/Chrom(e|ium)\/|CriOS\//, "Chromium"],
  [/Version\/.*Safari\//, "Safari"],
];

const systems: [RegExp, string][] = [
  [/iPhone|iPad/, "iOS"],
  [/Android/, "Android"],
  [/Windows/, "Windows"],
  [/Mac OS X|Macintosh/, "macOS"],
  [/CrOS/, "ChromeOS"],
  [/Linux|X11/, "Linux"],
];

const first = (words: [RegExp, string][], text: string) => words.find(([pattern]) => pattern.test(text))?.[1];

/** A device in words, from what its browser says of itself. */
export function deviceWords(userAgent: string): string {
  const browser = first(browsers, userAgent) ?? "A browser we do not know";
  const system = first(systems, userAgent);
  return system ? `${browser} on ${system}` : browser;
}
