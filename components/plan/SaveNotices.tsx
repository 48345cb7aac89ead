"use client";

import { signInAddress } from "../addresses";
import { partsOf } from "./partsOf";
import { ConflictPanel } from "./ConflictPanel";
import { SaveTrouble } from "./SaveTrouble";
import type { PlanSave } from "./usePlanSave";

/** How the values of a form's fields are called and written. */
export type FieldWords = (part: string, field: string, value: unknown) => { label: string; value: string };

interface Props {
  save: PlanSave;
  /** Where to come back to after signing in. */
  here: string;
  words: FieldWords;
}

/** Above every form that changes a plan: a save that did not arrive, and both values where somebody was quicker. */
export function SaveNotices({ save, here, words }: Props) {
  const { conflict, trouble } = save;
  return (
    <>
      {conflict && (
        <ConflictPanel
          name={conflict.name}
          when={conflict.when}
          {...bothSides(conflict, words)}
          saving={save.saving}
          onKeep={() => void save.keepMine()}
          onTake={save.takeTheirs}
        />
      )}
      {trouble && <SaveTrouble trouble={trouble} signInHref={signInAddress(here)} onRetry={() => void save.retry()} />}
    </>
  );
}

function bothSides({ changes, current }: NonNullable<PlanSave["conflict"]>, words: FieldWords) {
  const change = changes.find(({ act }) => act !== "add") ?? changes[0]!;
  if (change.act === "add") return { label: "New here", mine: "to be added", theirs: "not there" };
  const standing = partsOf(current.plan, change.part).find(({ id }) => id === change.id);
  const name = typeof standing?.name === "string" ? standing.name : "This";
  if (!standing) return { label: "This", mine: change.act === "remove" ? "removed" : "changed", theirs: "removed" };
  if (change.act === "remove") return { label: name, mine: "removed", theirs: "kept and changed" };
  const fields = Object.keys(change.patch);
  const mine = fields.map((field) => words(change.part, field, change.patch[field]));
  const theirs = fields.map((field) => words(change.part, field, standing[field]));
  return {
    label: mine.map(({ label }) => label).join(", "),
    mine: mine.map(({ value }) => value).join(", "),
    theirs: theirs.map(({ value }) => value).join(", "),
  };
}
