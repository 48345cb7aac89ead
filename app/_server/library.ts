import "server-only";
import { catalogue } from "@/lib/noise/catalogue";
import { elementKinds } from "@/lib/noise/elements";
import { criterionRecords, finishRecords, sourceRecords } from "@/lib/noise/library";
import { sourceKinds } from "@/lib/noise/sources";

/** What may be chosen while a plan is entered, as plain data for a page. */
export const sourceLibrary = () => sourceRecords;
export const finishLibrary = () => finishRecords;
export const criterionLibrary = () => criterionRecords;

/** Kinds of source: their name, what they are called, and where such a source works. */
export const sourceKindChoices = () => Object.values(sourceKinds).map(({ name, label, placement }) => ({ name, label, placement }));

/** Kinds of element, and the constructions of the catalogue each may be made of. */
export const elementKindChoices = () =>
  Object.values(elementKinds).map(({ name, label, constructed }) => ({
    name,
    label,
    constructed,
    constructions: catalogue
      .filter(({ fits }) => fits.some((kind) => kind === name))
      .map(({ key, name: called, says }) => ({ key, name: called, says })),
  }));
