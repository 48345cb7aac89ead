"use client";

import clsx from "clsx";
import { useId, useState, type KeyboardEvent } from "react";
import { formatQuantity, withUnit } from "../format";
import { Checkbox } from "../ui/Checkbox";
import { useFigures, withMark, type Figures } from "../ui/figures";
import { FieldError, errorId } from "../ui/FieldFrame";
import { NumberField } from "../ui/NumberField";
import { QuantityField } from "../ui/QuantityField";
import { toShown, unitName } from "../ui/quantities";
import { Select } from "../ui/Select";
import { TextField } from "../ui/TextField";
import { useTyped } from "../ui/useTyped";
import type { FieldSpec } from "./fieldSpec";
import type { PlannedSave } from "./usePlannedSave";
import type { PlanSave } from "./usePlanSave";

interface Props {
  specs: readonly FieldSpec[];
  /** Of what these fields speak: refusals are kept by it. */
  spot: string;
  save: PlanSave;
  planned: PlannedSave;
  /** Without the right to change, the same values as text. */
  locked?: boolean;
  className?: string;
}

export const fieldGrid = "grid grid-cols-2 items-start gap-x-3.5 gap-y-3";

/** Fields of a part. Each saves when it is left, on Enter, or when a choice is made. */
export function SpecFields({ specs, spot, save, planned, locked = false, className = fieldGrid }: Props) {
  if (locked) return <SpecTexts specs={specs} />;
  return (
    <div className={className}>
      {specs.map((spec) => {
        const place = `${spot}/${spec.label}`;
        const send = <V,>(changes: (value: V, plan: Parameters<Parameters<PlannedSave>[0]>[0]) => ReturnType<Parameters<PlannedSave>[0]>) =>
          (value: V) => void planned((plan) => changes(value, plan), place);
        return (
          <div key={place} className={clsx("min-w-0", spec.wide && "col-span-full")}>
            <SpecField spec={spec} error={save.errorOf(place)} send={send} />
          </div>
        );
      })}
    </div>
  );
}

type Send = <V>(changes: (value: V, plan: Parameters<Parameters<PlannedSave>[0]>[0]) => ReturnType<Parameters<PlannedSave>[0]>) => (value: V) => void;

function SpecField({ spec, error, send }: { spec: FieldSpec; error?: string; send: Send }) {
  switch (spec.kind) {
    case "words":
      return <WordsField spec={spec} error={error} onCommit={send(spec.changes)} />;
    case "quantity": {
      const { kind: _, changes, wide: __, ...rest } = spec;
      return <QuantityField {...rest} steps={{ metric: rest.quantity === "length" ? 0.1 : 1, us: rest.quantity === "length" ? 0.5 : 1 }} error={error} onCommit={send(changes)} />;
    }
    case "number": {
      const { kind: _, changes, wide: __, ...rest } = spec;
      return <NumberField {...rest} error={error} onCommit={send(changes)} />;
    }
    case "choice":
      return (
        <Select
          label={spec.label}
          hint={spec.hint}
          choices={spec.choices}
          value={spec.value}
          error={error}
          onChange={(event) => send(spec.changes)(event.target.value)}
        />
      );
    case "tick":
      return <TickField spec={spec} error={error} onCommit={send(spec.changes)} />;
  }
}

type Of<K extends FieldSpec["kind"]> = Extract<FieldSpec, { kind: K }>;

function TickField({ spec, error, onCommit }: { spec: Of<"tick">; error?: string; onCommit: (value: boolean) => void }) {
  const id = useId();
  return (
    <>
      <Checkbox
        label={spec.label}
        hint={spec.hint}
        checked={spec.value}
        aria-describedby={error ? errorId(id) : undefined}
        onChange={(event) => onCommit(event.target.checked)}
      />
      <FieldError id={id} error={error} />
    </>
  );
}

/** Words that save when the field is left or on Enter; a refused text stays. */
function WordsField({ spec, error, onCommit }: { spec: Of<"words">; error?: string; onCommit: (value: string) => void }) {
  const typed = useTyped(spec.value, (words) => words);
  const [complaint, setComplaint] = useState<string>();
  function commit() {
    const words = typed.text.trim();
    const empty = words === "" && !spec.optional;
    setComplaint(empty ? "This cannot be empty." : undefined);
    if (!empty && typed.hand(words)) onCommit(words);
  }
  return (
    <TextField
      label={spec.label}
      hint={spec.hint}
      maxLength={spec.most}
      autoComplete="off"
      value={typed.text}
      error={complaint ?? error}
      onChange={(event) => typed.type(event.target.value)}
      onFocus={typed.visit}
      onBlur={commit}
      onKeyDown={(event: KeyboardEvent) => event.key === "Enter" && commit()}
    />
  );
}

function SpecTexts({ specs }: { specs: readonly FieldSpec[] }) {
  const figures = useFigures();
  return (
    <dl className={fieldGrid}>
      {specs.map((spec) => (
        <div key={spec.label} className={clsx("min-w-0", spec.wide && "col-span-full")}>
          <dt className="text-second text-ink2">{spec.label}</dt>
          <dd className="break-words font-semibold">{textOf(spec, figures)}</dd>
        </div>
      ))}
    </dl>
  );
}

function textOf(spec: FieldSpec, { units, mark }: Figures): string {
  const figure = (value: number | null, unit: string) => {
    if (value === null) return "not given";
    const text = withMark(formatQuantity(value), mark);
    return unit ? withUnit(text, unit) : text;
  };
  switch (spec.kind) {
    case "words":
      return spec.value || "not given";
    case "quantity":
      return figure(spec.value === null ? null : toShown(spec.quantity, units, spec.value), unitName(spec.quantity, units));
    case "number":
      return figure(spec.value, spec.unit);
    case "choice":
      return spec.choices.find(({ value }) => value === spec.value)?.label ?? "not given";
    case "tick":
      return spec.value ? "yes" : "no";
  }
}
