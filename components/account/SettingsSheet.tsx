"use client";

import { useEffect, useState } from "react";
import { applyTheme, THEME_CHANGED } from "../frame/theme";
import { RadioGroup } from "../ui/RadioGroup";
import { Sheet } from "../ui/Sheet";
import type { AccountFacts } from "./Account";
import { useSetting } from "./useSetting";

const UNITS = [
  { value: "metric", label: "Metric", says: "metres, millimetres, kilograms, °C" },
  { value: "us", label: "US", says: "feet, inches, pounds, °F" },
] as const;

const MARKS = [
  { value: "point", label: "2.5" },
  { value: "comma", label: "2,5" },
] as const;

const THEMES = [
  { value: "system", label: "As this device has it" },
  { value: "light", label: "Chalk" },
  { value: "dark", label: "Night" },
] as const;

/** What the switch in the head of the page was turned to, since this page was drawn. */
function useTurned(): AccountFacts["theme"] | undefined {
  const [turned, setTurned] = useState<AccountFacts["theme"]>();
  useEffect(() => {
    const follow = () => {
      const shown = document.documentElement.dataset.theme;
      setTurned(shown === "light" || shown === "dark" ? shown : "system");
    };
    window.addEventListener(THEME_CHANGED, follow);
    return () => window.removeEventListener(THEME_CHANGED, follow);
  }, []);
  return turned;
}

/** How figures are shown and typed, and the colours. */
export function SettingsSheet({ facts }: { facts: AccountFacts }) {
  const units = useSetting("units", facts.units);
  const mark = useSetting("decimalMark", facts.decimalMark);
  const theme = useSetting("theme", facts.theme);
  const turned = useTurned();

  function colour(value: AccountFacts["theme"]) {
    applyTheme(value);
    theme.choose(value);
  }

  return (
    <Sheet heading="How it looks to you" says="decibels and hertz are the same everywhere">
      <div className="flex flex-col gap-5">
        <RadioGroup legend="Lengths, weights and temperatures" name="units" options={UNITS} chosen={units.chosen} onChoose={units.choose} error={units.error} />
        <RadioGroup legend="Two and a half is written" name="decimalMark" options={MARKS} chosen={mark.chosen} onChoose={mark.choose} error={mark.error} />
        <RadioGroup legend="Colours" name="theme" options={THEMES} chosen={turned ?? theme.chosen} onChoose={colour} error={theme.error} />
        <p role="status" className="min-h-5 text-second text-ink2">
          {units.says || mark.says || theme.says}
        </p>
      </div>
    </Sheet>
  );
}
