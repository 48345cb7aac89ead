export type Theme = "light" | "dark";

export const THEME_COOKIE = "stillyard-theme";

/** Absent or unknown follows the system. */
export function readTheme(cookie: string | undefined): Theme | undefined {
  return cookie === "light" || cookie === "dark" ? cookie : undefined;
}

/** Told to the page when a theme is chosen on it. */
export const THEME_CHANGED = "stillyard-theme-changed";

/** Shows a theme at once; the cookie serves the next page on this device. "system" follows the device again. */
export function applyTheme(theme: Theme | "system"): void {
  if (theme === "system") delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = theme;
  const age = theme === "system" ? 0 : 31_536_000;
  document.cookie = `${THEME_COOKIE}=${theme}; path=/; max-age=${age}; samesite=lax`;
  window.dispatchEvent(new Event(THEME_CHANGED));
}
