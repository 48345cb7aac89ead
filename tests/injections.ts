/** Fragments of SQL, JSON paths, templates, shells and markup, in several dresses. */
export function injectionStrings(): string[] {
  const seeds = [
    "'", '"', "`", "\\", "';", "' or '1'='1", '" or ""="', "'; drop table parts; --", "1; delete from users", "') or true --", "$1", "$$", ":name", "?", "%", "_", "%s%n",
    "{{7*7}}", "${7*7}", "#{7*7}", "<script>alert(1)</script>", "<img src=x onerror=alert(1)>", "javascript:alert(1)", "&lt;b&gt;", "../../etc/passwd", "| cat", "$(id)", "`id`",
    "params->>'name'", "name::jsonb", "$.name", "__proto__", "constructor", "null", "undefined", "NaN", "Infinity", "\u202e", "\ufeffx", "e\u0301", "𝄞", "\t\tx", "a\nb", "union select email from users",
  ];
  const dresses = [(text: string) => `x${text}x`, (text: string) => `x ${text.toUpperCase()} x`, (text: string) => `(${text})`, (text: string) => `x${text}${text}x`, (text: string) => `'${text}'`];
  return [...new Set(seeds.flatMap((seed) => dresses.map((dress) => dress(seed))))];
}
