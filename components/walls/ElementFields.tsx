"use client";

import { Icon } from "../marks/Icon";
import { NumberField } from "../ui/NumberField";
import type { PathElement } from "./elementWords";
import { inSquareCentimetres, inSquareMetres, type ElementPatch, type FieldName } from "./patches";
import { toSquareCentimetres, toSquareMetres } from "./units";

interface Props {
  element: PathElement;
  /** Undefined for who may change; otherwise the reason in words. */
  lockedBecause?: string;
  errors: Partial<Record<FieldName, string>>;
  onChange: (patch: ElementPatch) => void;
}

/** Size and openings of one element. Without the right to change, the same figures as text. */
export function ElementFields({ element, lockedBecause, errors, onChange }: Props) {
  if (lockedBecause !== undefined) return <LockedFields element={element} reason={lockedBecause} />;
  return (
    <div className="grid gap-5 mid:grid-cols-2">
      {element.kind === "leak" ? (
        <NumberField
          key={element.id}
          label="Open area"
          unit="cm²"
          min={1}
          max={100_000}
          value={toSquareCentimetres(element.area)}
          error={errors.area}
          onCommit={(value) => value !== null && onChange({ area: toSquareMetres(value) })}
        />
      ) : (
        <NumberField
          label="Area"
          unit="m²"
          step={0.1}
          min={0.01}
          max={10_000}
          value={element.area}
          error={errors.area}
          onCommit={(value) => value !== null && onChange({ area: value })}
        />
      )}
      <OpeningField element={element} error={errors.opening} onChange={onChange} />
    </div>
  );
}

function OpeningField({
  element,
  error,
  onChange,
}: {
  element: PathElement;
  error?: string;
  onChange: (patch: ElementPatch) => void;
}) {
  if (element.kind === "door") {
    return (
      <NumberField
        label="Gap at the seals"
        unit="cm²"
        min={0}
        max={10_000}
        hint="All open area round the leaf. Nought where the figures of the door already hold its cracks."
        value={toSquareCentimetres(element.params.gapArea)}
        error={error}
        onCommit={(value) => value !== null && onChange({ params: { gapArea: toSquareMetres(value) } })}
      />
    );
  }
  if (element.kind !== "window") return null;
  return (
    <NumberField
      label="Open part"
      unit="m²"
      step={0.05}
      min={0}
      max={20}
      hint="Nought is shut."
      value={element.params.openArea}
      error={error}
      onCommit={(value) => value !== null && onChange({ params: { openArea: value } })}
    />
  );
}

function LockedFields({ element, reason }: { element: PathElement; reason: string }) {
  const figures = [
    ["Area", element.kind === "leak" ? inSquareCentimetres(element.area) : inSquareMetres(element.area)],
    ...(element.kind === "door" ? [["Gap at the seals", inSquareCentimetres(element.params.gapArea)]] : []),
    ...(element.kind === "window" ? [["Open part", inSquareMetres(element.params.openArea)]] : []),
  ];
  return (
    <>
      <dl className="flex flex-wrap gap-x-10 gap-y-3">
        {figures.map(([label, figure]) => (
          <div key={label}>
            <dt className="text-second text-ink2">{label}</dt>
            <dd className="text-lead font-semibold">{figure}</dd>
          </div>
        ))}
      </dl>
      <LockedReason reason={reason} />
    </>
  );
}

export function LockedReason({ reason }: { reason: string }) {
  return (
    <p className="mt-4 flex items-center gap-2 text-second text-ink2">
      <Icon name="lock" size={18} />
      {reason}
    </p>
  );
}
