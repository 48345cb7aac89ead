"use client";

import { useState } from "react";
import type { Criterion } from "@/lib/noise/plan";
import { formatNumber, withUnit } from "../format";
import { Disclosure } from "../ui/Disclosure";
import { NineBandRow } from "../ui/NineBandRow";
import { NumberField } from "../ui/NumberField";
import { Select } from "../ui/Select";
import { useWidthClass } from "../ui/useWidthClass";
import { levelsOf, nightOf, typeAbove, typeFigure, typeLevels, typeNight, typeNumber, type LimitLibrary } from "./limitPatches";
import { figureWords, formOf, formWords, LIMIT_FORMS, weightedWords, type LimitForm } from "./limitWords";
import { SavedText } from "../ui/SavedText";
import { Segments } from "./Segments";
import type { Edits } from "./useLimitEdits";

export interface FigureProps {
  limit: Criterion;
  library: LimitLibrary;
  edits: Edits;
  lit: number | null;
  onLight: (index: number) => void;
}

/** How the limit is written. Another way is taken once a figure stands in it; until then the old one is weighed. */
export function LimitFigures(props: FigureProps) {
  const { limit } = props;
  const standing = formOf(limit);
  const [form, setForm] = useState(standing);
  const [stored, setStored] = useState(standing);
  if (stored !== standing) {
    setStored(standing);
    setForm(standing);
  }
  return (
    <div className="grid gap-5">
      <Segments
        label="Measured how"
        value={form}
        choices={LIMIT_FORMS.map((value) => ({ value, label: formWords[value] }))}
        hint={form === standing ? undefined : `Still weighed: ${figureWords(limit)}. It changes when a figure stands below.`}
        onChoose={setForm}
      />
      <FormFields {...props} form={form} />
      <NightRow {...props} form={form} />
    </div>
  );
}

function FormFields({ form, ...props }: FigureProps & { form: LimitForm }) {
  if (form === "bands") return <BandFields {...props} />;
  if (form === "number") return <NumberForm {...props} />;
  if (form === "figure") return <WeightedForm {...props} />;
  return <AboveForm {...props} />;
}

function BandFields({ limit, library, edits, lit, onLight }: FigureProps) {
  return (
    <NineBandRow
      key={limit.id}
      label="The nine figures"
      unit="dB"
      min={-100}
      max={160}
      values={levelsOf(limit)}
      lit={lit ?? undefined}
      onLight={onLight}
      hint="Paste nine from a clause or a table. An empty band is not weighed."
      error={edits.errorOf(limit.id, "levels")}
      onCommit={(levels) => void edits.limit(limit.id, "levels", (standing) => typeLevels(standing, levels, library))}
    />
  );
}

function NumberForm({ limit, library, edits }: FigureProps) {
  const { editions } = library;
  const current = editions.find(({ metric, key }) => metric === limit.metric && (key === limit.edition || metric === "NR"));
  const [key, setKey] = useState((current ?? editions[0])!.key);
  const edition = editions.find((each) => each.key === key)!;
  const value = current ? limit.value : null;
  const commit = (number: number, by = edition) => void edits.limit(limit.id, "value", (standing) => typeNumber(standing, number, by, library));
  return (
    <div className="grid gap-4 mid:grid-cols-2">
      <NumberField label={`${edition.metric} number`} min={0} max={100} value={value} error={edits.errorOf(limit.id, "value")} hint="The nine levels of that curve are written down and frozen." onCommit={(number) => number !== null && commit(number)} />
      <Select
        label="Curves and edition"
        value={key}
        choices={editions.map((each) => ({ value: each.key, label: each.label }))}
        hint={`${edition.provenance.document}, ${edition.provenance.clause}.`}
        onChange={({ target }) => {
          setKey(target.value);
          const next = editions.find((each) => each.key === target.value);
          if (next && value !== null) commit(value, next);
        }}
      />
    </div>
  );
}

function WeightedForm({ limit, library, edits }: FigureProps) {
  const standing = limit.metric === "dBA" || limit.metric === "dBC" ? limit.metric : null;
  const [metric, setMetric] = useState<"dBA" | "dBC">(standing ?? "dBA");
  const value = standing ? limit.value : null;
  const commit = (figure: number, by = metric) => void edits.limit(limit.id, "value", (now) => typeFigure(now, by, figure, library));
  const hidden = formatNumber(Math.abs(library.at63[metric]), 0);
  return (
    <div className="grid gap-4 mid:grid-cols-2">
      <NumberField label="The figure" unit={weightedWords[metric]} min={-20} max={160} value={value} error={edits.errorOf(limit.id, "value")} onCommit={(figure) => figure !== null && commit(figure)} />
      <Segments
        label="Weighted"
        value={metric}
        choices={[
          { value: "dBA", label: "dB(A)" },
          { value: "dBC", label: "dB(C)" },
        ]}
        hint={`${metric === "dBA" ? "One figure hides the bass: it" : "One figure"} counts 63\u00a0Hz ${withUnit(hidden, "dB")} less than it is (IEC 61672-1).`}
        onChoose={(next) => {
          setMetric(next);
          if (value !== null) commit(value, next);
        }}
      />
    </div>
  );
}

const isKnown = (limit: Criterion): boolean => nightOf(limit).some((level) => level !== null);

function AboveForm({ limit, library, edits }: FigureProps) {
  return (
    <NumberField
      label="Above the night, in every band"
      unit="dB"
      min={-20}
      max={60}
      value={limit.above}
      className="max-w-72"
      error={edits.errorOf(limit.id, "above")}
      hint={isKnown(limit) ? "The nine levels are the night’s plus this figure." : "Type the night’s nine levels first, below."}
      onCommit={(above) => above !== null && void edits.limit(limit.id, "above", (standing) => (isKnown(standing) ? typeAbove(standing, nightOf(standing), above, library) : undefined))}
    />
  );
}

/** The night without you: what a test has to tell the limit from. */
function NightRow(props: FigureProps & { form: LimitForm }) {
  const small = useWidthClass() === 390;
  if (!small || props.form === "above") return <NightFields {...props} />;
  return (
    <Disclosure summary="The night itself, in nine bands">
      <NightFields {...props} />
    </Disclosure>
  );
}

function NightFields({ limit, library, edits, lit, onLight, form }: FigureProps & { form: LimitForm }) {
  return (
    <div className="grid gap-4">
      <NineBandRow
        key={limit.id}
        label="The night itself"
        unit="dB"
        min={-100}
        max={160}
        values={nightOf(limit)}
        lit={lit ?? undefined}
        onLight={onLight}
        hint={form === "above" ? undefined : "Levels without you, at the quietest credible hour. They change no verdict; they show where a test could not prove the limit."}
        error={edits.errorOf(limit.id, "background")}
        onCommit={(night) => void edits.limit(limit.id, "background", (standing) => typeNight(standing, night, library))}
      />
      {limit.background && (
        <SavedText
          label="How the night was come by"
          value={limit.backgroundSays}
          most={200}
          hint="Such as: exceeded nine tenths of the time, three nights, quietest quarter hour."
          error={edits.errorOf(limit.id, "backgroundSays")}
          onCommit={(backgroundSays) => void edits.limit(limit.id, "backgroundSays", () => ({ backgroundSays }))}
        />
      )}
    </div>
  );
}
