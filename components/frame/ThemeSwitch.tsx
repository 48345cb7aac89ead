"use client";

import { useEffect, useSyncExternalStore } from "react";
import { meRoute } from "../addresses";
import { Icon } from "../marks/Icon";
import { Button } from "../ui/Button";
import { applyTheme, THEME_CHANGED, THEME_COOKIE, type Theme } from "./theme";

const SYSTEM_DARK = "(prefers-color-scheme: dark)";

const current = (): Theme => {
  const chosen = document.documentElement.dataset.theme;
  if (chosen === "light" || chosen === "dark") return chosen;
  return window.matchMedia(SYSTEM_DARK).matches ? "dark" : "light";
};

function listen(changed: () => void) {
  const system = window.matchMedia(SYSTEM_DARK);
  system.addEventListener("change", changed);
  window.addEventListener(THEME_CHANGED, changed);
  return () => {
    system.removeEventListener("change", changed);
    window.removeEventListener(THEME_CHANGED, changed);
  };
}

const isChosenHere = (): boolean => document.cookie.split("; ").some((cookie) => cookie.startsWith(`${THEME_COOKIE}=`));

/** A theme that could not be stored is no loss worth a message: this device has it in its cookie. */
function storeTheme(theme: Theme) {
  fetch(meRoute, {
    method: "PATCH",
    headers: { "Content-Type": "application/json" },
    body: JSON.stringify({ theme }),
  }).catch(() => undefined);
}

/** Chalk or Night. `theme` is what the account or the cookie says; without it the system decides. */
export function ThemeSwitch({ theme, signedIn = false }: { theme?: Theme; signedIn?: boolean }) {
  const shown = useSyncExternalStore(listen, current, () => theme ?? "light");
  const dark = shown === "dark";
  // A device that nothing was chosen on takes the choice of the account; after that it keeps its own.
  useEffect(() => {
    if (theme && !isChosenHere()) applyTheme(theme);
  }, [theme]);

  function turn() {
    const other = dark ? "light" : "dark";
    applyTheme(other);
    if (signedIn) storeTheme(other);
  }

  return (
    <Button
      look="square"
      aria-pressed={dark}
      aria-label="Use night colours"
      title={dark ? "Back to daylight colours" : "Use night colours"}
      icon={<Icon name="moon" />}
      onClick={turn}
    />
  );
}
