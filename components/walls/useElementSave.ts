"use client";

import { useAtom, useSetAtom, useStore } from "jotai";
import { useRef, useState } from "react";
import { savePart, type Saved } from "../plan/save";
import { answerAtom, savingAtom, type Answer } from "../state/plan";
import { agoWords } from "../plan/agoWords";
import { fieldOf, type ElementPatch, type FieldName } from "./patches";
import type { Trouble } from "../plan/SaveTrouble";

export interface Conflict {
  patch: ElementPatch;
  current: Answer;
  name: string;
  /** How long ago, in words. */
  when: string;
}

/** Saves one element, one change after the other, and keeps what went wrong beside what was meant. */
export function useElementSave(projectId: string, elementId: string) {
  const [answer, setAnswer] = useAtom(answerAtom);
  const setSaving = useSetAtom(savingAtom);
  const store = useStore();
  const queue = useRef(Promise.resolve());
  const [before, setBefore] = useState<Answer>();
  const [errors, setErrors] = useState<Partial<Record<FieldName, string>>>({});
  const [trouble, setTrouble] = useState<Trouble & { patch: ElementPatch }>();
  const [conflict, setConflict] = useState<Conflict>();

  function settle(patch: ElementPatch, from: Answer, saved: Saved) {
    setErrors(
      saved.kind === "refused" ? { [fieldOf(patch)]: Object.values(saved.fields)[0] ?? saved.message } : {},
    );
    setTrouble(troubleOf(patch, saved));
    if (saved.kind === "saved") {
      setBefore(from);
      setConflict(undefined);
      setAnswer(saved.answer);
    } else if (saved.kind === "stale") {
      setConflict({
        patch,
        current: saved.current,
        name: saved.changedBy?.name ?? "Somebody else",
        when: agoWords(saved.changedBy?.at),
      });
    }
  }

  async function send(patch: ElementPatch, from: Answer) {
    setSaving(true);
    const saved = await savePart({
      projectId,
      revision: from.revision,
      part: "elements",
      id: elementId,
      patch,
    });
    setSaving(false);
    settle(patch, from, saved);
  }

  // Quick steps in a field must not overtake each other: each save starts from the answer of the one before.
  function save(patch: ElementPatch, from?: Answer): Promise<void> {
    queue.current = queue.current.then(() => send(patch, from ?? store.get(answerAtom)));
    return queue.current;
  }

  function takeTheirs() {
    if (!conflict) return;
    setBefore(undefined);
    setAnswer(conflict.current);
    setConflict(undefined);
  }

  return {
    answer,
    before,
    errors,
    trouble,
    conflict,
    save,
    takeTheirs,
    keepMine: () => conflict && save(conflict.patch, conflict.current),
    retry: () => trouble && save(trouble.patch),
  };
}

function troubleOf(patch: ElementPatch, saved: Saved): (Trouble & { patch: ElementPatch }) | undefined {
  if (saved.kind === "signedOut") return { kind: "signedOut", patch };
  if (saved.kind === "failed" || saved.kind === "gone")
    return { kind: "failed", message: saved.message, patch };
  return undefined;
}
