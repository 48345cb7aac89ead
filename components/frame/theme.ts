export type Theme = "light" | "dark";

export const THEME_COOKIE = "stillyard-theme";

/** Absent or unknown follows the system. */
export function readTheme(cookie: string | undefined): Theme | undefined {
  return cookie === "light" || cookie === "dark" ? cookie : undefined;
}
