"use client";

import { useState } from "react";
import type { CriterionRecord } from "@/lib/noise/library";
import { Icon } from "../marks/Icon";
import { Button } from "../ui/Button";
import { Select } from "../ui/Select";
import { documentWords } from "./limitWords";

interface Props {
  records: readonly CriterionRecord[];
  label: string;
  verb: string;
  saving: boolean;
  error?: string;
  onCopy: (libraryKey: string) => void;
}

/** A limit of the library, or nine figures of one's own: what is copied stays as it is. */
export function LimitChooser({ records, label, verb, saving, error, onCopy }: Props) {
  const [key, setKey] = useState(records[0]?.key ?? "");
  const record = records.find((each) => each.key === key);
  return (
    <div>
      <Select label={label} value={key} error={error} choices={records.map(({ key: value, name }) => ({ value, label: name }))} onChange={(event) => setKey(event.target.value)} />
      {record && (
        <p className="mt-2 text-second text-ink2">
          {record.says} {documentWords(record.provenance)}.
        </p>
      )}
      <div className="mt-3 flex flex-wrap items-center gap-3">
        <Button look="ink" disabled={saving || !record} onClick={() => onCopy(key)}>
          {verb}
        </Button>
        <p className="flex min-w-0 flex-1 items-center gap-1.5 text-second text-ink2">
          <Icon name="lock" size={18} />
          <span className="min-w-40">Copied and frozen: a later edition changes nothing here.</span>
        </p>
      </div>
    </div>
  );
}
