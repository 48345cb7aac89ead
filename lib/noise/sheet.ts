import type { Construction, Layer } from "./construction";
import { effectiveLoss } from "./effective";
import { countLeaves } from "./layers";
import { elementDeviation } from "./model/deviations";
import { sheetLayersOf, type SheetLayer } from "./sheetLayers";
import type { Basis, Provenance } from "./spectrum";
import { toOutSpectrum, type OutSpectrum } from "./verdict";

export type { CutStud, LayerLook, SheetLayer } from "./sheetLayers";

export type Joint = Extract<Layer, { kind: "cavity" }>["connection"];

/** Everything a page says of one construction, as plain figures: the screen computes none of them. */
export interface ConstructionSheet {
  /** Id in the plan, or key in the catalogue. */
  key: string;
  name: string;
  /** One line for the builder; empty for a construction of the project's own. */
  says: string;
  layers: SheetLayer[];
  /** dB per band of the construction alone, what each figure rests on, and one standard deviation, dB. */
  loss: OutSpectrum;
  bases: Basis[];
  doubts: number[];
  /** dB per band in the place of one element, with its gap or open part; only where a page is about that element. */
  hung?: OutSpectrum;
  /** kg/m², boards alone, and m; null where the layers do not say. */
  surfaceMass: number | null;
  thickness: number | null;
  /** Hz; null for one leaf. */
  massAirMass: number | null;
  /** Sheets of boards that move as one, and what joins them, from the yard. */
  leaves: number;
  joints: Joint[];
  provenance: Provenance;
}

/**
 * The sheet of a construction of a plan or of the catalogue: layers, loss in dB over the nine bands with its doubt, mass
 * in kg/m² and thickness in m. Pure, and total for every construction that passes its schema. Solver method, section 2.
 */
export function sheetOf(
  construction: Construction,
  { key = construction.id, says = "" } = {},
): ConstructionSheet {
  const { loss, bases, surfaceMass, thickness, facts } = effectiveLoss(construction);
  return {
    key,
    says,
    name: construction.name,
    layers: sheetLayersOf(construction),
    loss: toOutSpectrum(loss),
    bases: [...bases],
    doubts: bases.map(elementDeviation),
    surfaceMass,
    thickness,
    massAirMass: facts?.massAirMass ?? null,
    leaves: countLeaves(construction),
    joints: construction.layers.flatMap((layer) => (layer.kind === "cavity" ? [layer.connection] : [])),
    provenance: construction.provenance,
  };
}
