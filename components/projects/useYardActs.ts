"use client";

import { useState } from "react";
import { saveProject, type Saved } from "../plan/save";
import { copyYard, makeYard } from "./makeYard";
import type { ProjectLine } from "./ProjectLine";

/** What is said over the list after an act. */
export type Outcome =
  | { kind: "copied"; name: string; href: string }
  | { kind: "archived"; line: ProjectLine }
  | { kind: "restored"; line: ProjectLine }
  | { kind: "trouble"; heading: string; message: string };

/** What has been saved and has not come back from the server yet. */
type Ahead = { name?: string; revision: number; gone?: boolean };

export interface YardActs {
  lines: ProjectLine[];
  outcome: Outcome | undefined;
  busy: boolean;
  rename: (line: ProjectLine, name: string) => Promise<string | undefined>;
  copy: (line: ProjectLine) => Promise<void>;
  setArchived: (line: ProjectLine, archived: boolean) => Promise<void>;
  copyExample: (facts: { name: string; says: string; timeZone: string; currency: string }) => Promise<string | undefined>;
}

/** Renaming, copying, archiving; `refresh` asks for the list anew. */
export function useYardActs(projects: readonly ProjectLine[], refresh: () => void): YardActs {
  const [known, setKnown] = useState(projects);
  const [ahead, setAhead] = useState<Record<string, Ahead>>({});
  const [outcome, setOutcome] = useState<Outcome>();
  const [busy, setBusy] = useState(false);
  if (known !== projects) {
    setKnown(projects);
    setAhead({});
  }

  const lines = projects
    .filter(({ id }) => !ahead[id]?.gone)
    .map((line) => ({ ...line, name: ahead[line.id]?.name ?? line.name, revision: ahead[line.id]?.revision ?? line.revision }));

  const save = async (line: ProjectLine, patch: Record<string, unknown>, then: Omit<Ahead, "revision">) => {
    const saved = await saveProject({ projectId: line.id, revision: line.revision, patch });
    const revision = saved.kind === "saved" ? saved.answer.revision : saved.kind === "stale" ? saved.current.revision : line.revision;
    setAhead((now) => ({ ...now, [line.id]: { ...now[line.id], revision, ...(saved.kind === "saved" && then) } }));
    if (saved.kind === "saved") refresh();
    return { revision, trouble: troubleOf(saved) };
  };

  const alone = async (work: () => Promise<void>) => {
    if (busy) return;
    setBusy(true);
    setOutcome(undefined);
    await work();
    setBusy(false);
  };

  return {
    lines,
    outcome,
    busy,
    rename: async (line, name) => (await save(line, { name }, { name })).trouble,
    copy: (line) =>
      alone(async () => {
        const made = await copyYard(line.id);
        if (made.kind !== "made") return setOutcome({ kind: "trouble", heading: `“${line.name}” was not copied`, message: made.message });
        setOutcome({ kind: "copied", name: line.name, href: made.next });
        refresh();
      }),
    setArchived: (line, archived) =>
      alone(async () => {
        const { revision, trouble } = await save(line, { archived }, { gone: true });
        if (trouble === undefined) return setOutcome({ kind: archived ? "archived" : "restored", line: { ...line, revision } });
        setOutcome({ kind: "trouble", heading: `“${line.name}” was not ${archived ? "archived" : "restored"}`, message: trouble });
      }),
    copyExample: async (facts) => {
      setBusy(true);
      const made = await makeYard({ ...facts, start: "example" });
      if (made.kind === "made") return made.id;
      setBusy(false);
      setOutcome({ kind: "trouble", heading: "The example was not copied", message: made.message });
      return undefined;
    },
  };
}

/** Why something was not saved; nothing where it was. */
function troubleOf(saved: Saved): string | undefined {
  switch (saved.kind) {
    case "saved":
      return undefined;
    case "stale":
      return `${saved.changedBy.name} changed this yard a moment ago. Ask once more to have it your way.`;
    case "refused":
      return Object.values(saved.fields)[0] ?? saved.message;
    default:
      return saved.message;
  }
}
