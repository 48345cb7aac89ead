"use client";

import clsx from "clsx";
import { useId, useState, type FormEvent } from "react";
import { OCTAVE_BANDS } from "../../lib/noise/bands";
import type { ConstructionSheet } from "../../lib/noise/sheet";
import { formatNumber, formatQuantity, wholeDecibels } from "../format";
import { BasisMark } from "../marks/BasisMark";
import { Icon } from "../marks/Icon";
import { Button } from "../ui/Button";
import { FieldError } from "../ui/FieldFrame";
import { listedLoss } from "./choices";
import { toMillimetres } from "./units";

interface Props {
  /** "doors", "walls": what the list holds. */
  many: string;
  /** Kind of the element; a door is listed with its gap. */
  kind: string;
  choices: readonly ConstructionSheet[];
  /** Key of the construction that stands in the plan. */
  current: string | null;
  saving: boolean;
  error?: string;
  /** The marked one changes before anything is saved; undefined is the one that stands. */
  onMark: (key: string | undefined) => void;
  onChoose: (key: string) => void;
}

/** Bands always shown: what a kick drum does is decided there. */
const SHOWN = [63, 125].map((hertz) => OCTAVE_BANDS.findIndex((band) => band === hertz));

/** Constructions that fit the element. Arrows move the mark, Enter or the button puts the marked one in. */
export function ConstructionChoice({ many, kind, choices, current, saving, error, onMark, onChoose }: Props) {
  const id = useId();
  const [marked, setMarked] = useState(current);
  const [standing, setStanding] = useState(current);
  if (standing !== current) {
    setStanding(current);
    setMarked(current);
  }
  const mark = (key: string) => {
    setMarked(key);
    onMark(key === current ? undefined : key);
  };
  const choose = (event: FormEvent) => {
    event.preventDefault();
    if (marked !== null && marked !== current && !saving) onChoose(marked);
  };
  const chosen = choices.find(({ key }) => key === marked);
  return (
    <form onSubmit={choose} aria-describedby={error ? `${id}-error` : undefined}>
      <fieldset className="min-w-0">
        <legend className="sr-only">Choose from the library&apos;s {many}</legend>
        <ColumnHeads />
        {choices.map((sheet) => (
          <Choice
            key={sheet.key}
            group={id}
            sheet={sheet}
            loss={listedLoss(sheet, kind)}
            marked={sheet.key === marked}
            standing={sheet.key === current}
            onMark={mark}
          />
        ))}
      </fieldset>
      <FieldError id={id} error={error} />
      <div className="mt-4 flex flex-wrap items-center gap-x-4 gap-y-2">
        <Button
          type="submit"
          look="ink"
          icon={<Icon name="tick" />}
          reason={chosen && marked !== current ? undefined : "Mark another one above first."}
        >
          {saving ? "Putting it in" : "Choose"}
        </Button>
        {chosen && marked !== current && <p className="text-second text-ink2">{chosen.name}</p>}
      </div>
    </form>
  );
}

const columns =
  "grid grid-cols-[24px_minmax(0,1fr)_repeat(2,minmax(44px,auto))] gap-x-3 mid:grid-cols-[24px_minmax(0,1fr)_repeat(2,52px)_repeat(2,70px)]";

function ColumnHeads() {
  const shared = "whitespace-nowrap text-right text-second font-semibold text-ink2";
  return (
    <div aria-hidden="true" className={clsx(columns, "items-end border-b-2 border-ink px-2.5 pb-2")}>
      <span />
      <span className="text-second font-semibold text-ink2">Name, and what its figures rest on</span>
      <span className={clsx(shared, "hidden mid:block")}>mm</span>
      <span className={clsx(shared, "hidden mid:block")}>kg/m²</span>
      {SHOWN.map((index) => (
        <span key={index} className={shared}>
          <span className="hidden mid:inline">dB at </span>
          {OCTAVE_BANDS[index]}
          <span className="mid:hidden">&nbsp;Hz</span>
        </span>
      ))}
    </div>
  );
}

interface ChoiceProps {
  group: string;
  sheet: ConstructionSheet;
  loss: ConstructionSheet["loss"];
  marked: boolean;
  standing: boolean;
  onMark: (key: string) => void;
}

function Choice({ group, sheet, loss, marked, standing, onMark }: ChoiceProps) {
  const [low] = SHOWN;
  const basis = basisOf(sheet, loss);
  const figure = "text-right text-table font-semibold";
  return (
    <label
      className={clsx(
        columns,
        "min-h-10 cursor-pointer items-baseline border-t border-rule px-2.5 py-2.5 first-of-type:border-t-0 hover:bg-well",
        marked && "bg-lampwash shadow-[inset_6px_0_0_var(--lamp)] hover:bg-lampwash",
      )}
    >
      <input
        type="radio"
        name={group}
        value={sheet.key}
        checked={marked}
        onChange={() => onMark(sheet.key)}
        aria-label={spoken(sheet, loss, standing)}
        className="size-5 self-start accent-ink"
      />
      <span className="min-w-0 font-semibold">
        {sheet.name}
        {standing && (
          <span className="ml-2 whitespace-nowrap rounded-tag border border-edge px-1.5 text-least font-semibold text-ink2">
            stands here now
          </span>
        )}
      </span>
      <span className={clsx(figure, "hidden mid:block")}>{thicknessOf(sheet)}</span>
      <span className={clsx(figure, "hidden mid:block")}>{massOf(sheet)}</span>
      {SHOWN.map((index) => (
        <span key={index} className={figure}>
          {wholeDecibels(loss[index] ?? "unknown")}
        </span>
      ))}
      <span className="col-start-2 col-end-[-1] min-w-0 text-second text-ink2 mid:col-end-3">
        {sheet.says && <span className="block">{sheet.says}</span>}
        <BasisMark basis={basis} doubt={basis === "unknown" ? undefined : sheet.doubts[low!]} />
        <span className="block mid:hidden">{measures(sheet)}</span>
      </span>
    </label>
  );
}

const thicknessOf = ({ thickness }: ConstructionSheet) =>
  thickness === null ? "–" : formatQuantity(toMillimetres(thickness), 0);
const massOf = ({ surfaceMass }: ConstructionSheet) =>
  surfaceMass === null ? "–" : formatNumber(surfaceMass, surfaceMass < 10 ? 1 : 0);
const measures = (sheet: ConstructionSheet) =>
  [
    sheet.thickness !== null && `${thicknessOf(sheet)} mm`,
    sheet.surfaceMass !== null && `${massOf(sheet)} kg/m²`,
  ]
    .filter(Boolean)
    .join(", ");

const basisOf = ({ bases }: ConstructionSheet, loss: ConstructionSheet["loss"]) =>
  (loss[SHOWN[0]!] !== "unknown" && bases[SHOWN[0]!]) || "unknown";

const decibelsSpoken = (loss: ConstructionSheet["loss"][number]) =>
  typeof loss === "number" ? `${wholeDecibels(loss)} dB` : loss;

const spokenMeasures = (sheet: ConstructionSheet) =>
  [
    sheet.thickness === null ? "thickness unknown" : `${thicknessOf(sheet)} mm`,
    sheet.surfaceMass === null ? "weight unknown" : `${massOf(sheet)} kg/m²`,
  ].join(", ");

function spoken(sheet: ConstructionSheet, loss: ConstructionSheet["loss"], standing: boolean): string {
  const stops = SHOWN.map(
    (index) => `${decibelsSpoken(loss[index] ?? "unknown")} at ${OCTAVE_BANDS[index]} Hz`,
  ).join(", ");
  return `${sheet.name}${standing ? ", stands here now" : ""}, ${spokenMeasures(sheet)}, stops ${stops}, ${basisOf(sheet, loss)}`;
}
