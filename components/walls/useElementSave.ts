"use client";

import { usePlannedSave } from "../plan/usePlannedSave";
import { usePlanSave } from "../plan/usePlanSave";
import { fieldOf, type ElementPatch, type FieldName } from "./patches";

const FIELDS: readonly FieldName[] = ["construction", "area", "opening"];

/** Saves what the page of one element changes; refusals are kept by the field they belong to. */
export function useElementSave(projectId: string, elementId: string) {
  const save = usePlanSave(projectId);
  const planned = usePlannedSave(save);
  const spotOf = (field: FieldName) => `element/${elementId}/${field}`;
  const errors = Object.fromEntries(FIELDS.map((field) => [field, save.errorOf(spotOf(field))])) as Partial<Record<FieldName, string>>;
  return {
    save,
    planned,
    errors,
    patch: (patch: ElementPatch) => void planned(() => [{ act: "change", part: "elements", id: elementId, patch }], spotOf(fieldOf(patch))),
  };
}
