"use client";

import type { Criterion } from "@/lib/noise/plan";
import { Checkbox } from "../ui/Checkbox";
import { averagingWords } from "./limitWords";
import { SavedText } from "../ui/SavedText";
import { Segments } from "./Segments";
import type { Edits } from "./useLimitEdits";

/** The words one weighs against: where they stand, since when, and who may read them where. */
export function ClauseFields({ limit, edits }: { limit: Criterion; edits: Edits }) {
  const { id, provenance } = limit;
  const error = (field: string, path?: string) => edits.errorOf(id, field, path);
  const read = (field: string, part: Partial<Criterion["provenance"]>) =>
    void edits.limit(id, field, (standing) => ({ provenance: { ...standing.provenance, ...part } }));
  const day = (field: "inForce" | "readOn") => (value: string) => void edits.limit(id, field, () => ({ [field]: value || null }));
  return (
    <div className="grid gap-4">
      <SavedText
        label="The clause, in its own words"
        lines={4}
        most={2000}
        value={limit.clauseText}
        error={error("clauseText")}
        hint="Copy the sentence as it stands, with its hours and its windows. Nothing is read out of it."
        onCommit={(clauseText) => void edits.limit(id, "clauseText", () => ({ clauseText }))}
      />
      <div className="grid gap-4 mid:grid-cols-2">
        <SavedText label="Where it stands" value={provenance.document} most={400} needed error={error("document", "provenance.document")} onCommit={(document) => read("document", { document })} />
        <SavedText label="Clause, table or page" value={provenance.clause} most={400} error={error("clause", "provenance.clause")} onCommit={(clause) => read("clause", { clause })} />
        <SavedText label="In force since" type="date" value={limit.inForce ?? ""} error={error("inForce")} onCommit={day("inForce")} />
        <SavedText label="Read on" type="date" value={limit.readOn ?? ""} error={error("readOn")} onCommit={day("readOn")} />
      </div>
      <Checkbox label="From memory, not read" hint="Everybody sees the mark until somebody has read the document." checked={provenance.memory} onChange={({ target }) => read("memory", { memory: target.checked })} />
      <div className="grid gap-4 mid:grid-cols-2">
        <Segments
          label="Where it is checked"
          value={limit.indoors === null ? null : limit.indoors ? "in" : "out"}
          choices={[
            { value: "in", label: "Indoors" },
            { value: "out", label: "Outdoors" },
          ]}
          error={error("indoors")}
          onChoose={(place) => void edits.limit(id, "indoors", () => ({ indoors: place === "in" }))}
        />
        <SavedText label="In words" value={limit.place} most={200} hint="Such as: in bed, window ajar." error={error("place")} onCommit={(place) => void edits.limit(id, "place", () => ({ place }))} />
        <Segments
          label="Averaged over"
          className="mid:col-span-2"
          value={limit.averaging}
          choices={[
            { value: "loudest", label: averagingWords.loudest },
            { value: "whole", label: averagingWords.whole },
          ]}
          error={error("averaging")}
          hint={limit.averaging === "whole" ? "The share of the time that each source runs counts." : "Everything that plays then plays the whole quarter hour."}
          onChoose={(averaging) => void edits.limit(id, "averaging", () => ({ averaging }))}
        />
      </div>
    </div>
  );
}
