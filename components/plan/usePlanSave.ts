"use client";

import { useAtom, useStore } from "jotai";
import { useRef, useState } from "react";
import { answerAtom, savingAtom, type Answer } from "../state/plan";
import { agoWords } from "./agoWords";
import { addPart, removePart, saveChanges, savePart, type PlanChange, type Saved } from "./save";
import type { Trouble } from "./SaveTrouble";

type Changes = readonly PlanChange[];

export interface PlanConflict {
  changes: Changes;
  current: Answer;
  /** Who was quicker, and how long ago in words. */
  name: string;
  when: string;
  spot: string;
}

/**
 * Saves changes of a plan, one after the other, and keeps what went wrong beside what was meant. A `spot` is the form a
 * change comes from: refusals are kept per spot, so that they stand beside the field that was typed in.
 */
export function usePlanSave(projectId: string) {
  const [answer, setAnswer] = useAtom(answerAtom);
  const [saving, setSaving] = useAtom(savingAtom);
  const store = useStore();
  const queue = useRef<Promise<unknown>>(Promise.resolve());
  const lately = useRef<Twins>(undefined);
  const [before, setBefore] = useState<Answer>();
  const [refusals, setRefusals] = useState<Record<string, Refusal>>({});
  const [trouble, setTrouble] = useState<Trouble & { changes: Changes; spot: string }>();
  const [conflict, setConflict] = useState<PlanConflict>();

  function settle(changes: Changes, spot: string, from: Answer, saved: Saved) {
    const { [spot]: _, ...others } = refusals;
    setRefusals(saved.kind === "refused" ? { ...others, [spot]: refusalOf(changes, saved) } : others);
    setTrouble(troubleOf(changes, spot, saved));
    if (saved.kind === "saved") {
      setBefore(from);
      setConflict(undefined);
      setAnswer(saved.answer);
    } else if (saved.kind === "stale") {
      const { current, changedBy } = saved;
      setConflict({ changes, spot, current, name: changedBy.name, when: agoWords(changedBy.at) });
    }
  }

  async function send(changes: Changes, spot: string, from: Answer): Promise<Saved> {
    setSaving(true);
    const saved = await sendChanges(projectId, from.revision, changes);
    setSaving(false);
    settle(changes, spot, from, saved);
    return saved;
  }

  /** Each save starts from the answer of the one before: quick steps in a field must not overtake each other. */
  function save(changes: PlanChange | Changes, spot = "", from?: Answer): Promise<Saved> {
    const list = Array.isArray(changes) ? (changes as Changes) : [changes as PlanChange];
    const act = JSON.stringify([list, spot]);
    if (isTwin(lately.current, act)) return lately.current.sent;
    const sent = queue.current.then(() => send(list, spot, from ?? store.get(answerAtom)));
    queue.current = sent;
    lately.current = list.some((change) => change.act === "add") ? foldTwins(act, sent) : undefined;
    return sent;
  }

  function takeTheirs() {
    if (!conflict) return;
    setBefore(undefined);
    setAnswer(conflict.current);
    setConflict(undefined);
  }

  return {
    projectId,
    answer,
    before,
    saving,
    trouble,
    conflict,
    save,
    /** The refusal of a spot, whole or of one field; undefined where there is none. */
    errorOf: (spot: string, field?: string): string | undefined =>
      field === undefined ? refusals[spot]?.message : refusals[spot]?.fields[field],
    takeTheirs,
    keepMine: () => conflict && save(conflict.changes, conflict.spot, conflict.current),
    retry: () => trouble && save(trouble.changes, trouble.spot),
  };
}

/** An addition on its way or just made: the same wish again is a double click, not a second one. */
interface Twins {
  act: string;
  sent: Promise<Saved>;
  /** Milliseconds of `performance.now()`. */
  until: number;
}

const DOUBLE_CLICK = 1_000;

/** Each click of a row of them holds the door shut a while longer. */
function isTwin(twins: Twins | undefined, act: string): twins is Twins {
  const now = performance.now();
  if (twins?.act !== act || now >= twins.until) return false;
  twins.until = Math.max(twins.until, now + DOUBLE_CLICK);
  return true;
}

function foldTwins(act: string, sent: Promise<Saved>): Twins {
  const twins = { act, sent, until: Infinity };
  void sent.then(({ kind }) => (twins.until = kind === "saved" ? performance.now() + DOUBLE_CLICK : 0));
  return twins;
}

export type PlanSave = ReturnType<typeof usePlanSave>;

interface Refusal {
  message: string;
  fields: Record<string, string>;
}

function sendChanges(projectId: string, revision: number, changes: Changes): Promise<Saved> {
  const [only, ...more] = changes;
  if (!only || more.length) return saveChanges({ projectId, revision, changes });
  const written = { projectId, revision, part: only.part };
  if (only.act === "add") return addPart({ ...written, values: only.values });
  return only.act === "change" ? savePart({ ...written, id: only.id, patch: only.patch }) : removePart({ ...written, id: only.id });
}

/** Fields by their own names; of several changes "changes.2.values.area" is "area" too. What no field bears is the message. */
function refusalOf(changes: Changes, { message, fields }: Extract<Saved, { kind: "refused" }>): Refusal {
  const bare = Object.entries(fields).map(([field, words]) => [field.replace(/^changes\.\d+\.(values|patch|id)\./, ""), words]);
  return { message: bare.length === 1 ? String(bare[0]![1]) : message, fields: Object.fromEntries(bare) };
}

function troubleOf(changes: Changes, spot: string, saved: Saved): (Trouble & { changes: Changes; spot: string }) | undefined {
  if (saved.kind === "signedOut") return { kind: "signedOut", changes, spot };
  if (saved.kind === "failed" || saved.kind === "gone") return { kind: "failed", message: saved.message, changes, spot };
  return undefined;
}
