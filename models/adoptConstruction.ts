import { findConstruction } from "../lib/noise/catalogue";
import { Construction } from "./Construction";
import { PartFault } from "./PartFault";
import { addPart, findPart, type Place } from "./parts";
import type { Act } from "./Revision";

export interface Adopted {
  constructionId: string;
  /** The copy, where the project did not hold one yet. */
  act: Act | null;
  /** What the record advises for the element it is chosen for. */
  suggested: object;
}

/**
 * A construction of the catalogue as part of a project: the record is copied with its key and where it was read, so that
 * later editions of the catalogue change no old verdict.
 */
export async function adoptConstruction(place: Place, elementId: string, catalogueKey: string): Promise<Adopted> {
  const record = findConstruction(catalogueKey);
  const element = await findPart(place, "element", elementId);
  if (!record) throw misfit("There is no such construction in the catalogue.");
  const { key: _, says: __, suggested = {}, ...values } = record;
  if (!values.fits.some((kind) => kind === element.kind)) throw misfit("This construction is not made for such a place.");
  const { projectId, transaction } = place;
  const standing = await Construction.findOne({ where: { projectId, catalogueKey }, transaction });
  if (standing) return { constructionId: standing.id, act: null, suggested };
  const [act] = await addPart(place, "construction", { ...values, catalogueKey });
  if (!act) throw new Error("Adding a construction left no act.");
  return { constructionId: act.id, act, suggested };
}

const misfit = (words: string) => new PartFault("invalid", "This value does not fit.", { "construction.catalogueKey": words });
