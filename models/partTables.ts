import type { Model, ModelStatic, Transaction } from "sequelize";
import type { PartKind, Plan } from "../lib/noise/plan";
import { Building } from "./Building";
import { Construction } from "./Construction";
import { Criterion } from "./Criterion";
import { Fence } from "./Fence";
import { Incidence } from "./Incidence";
import { Lot } from "./Lot";
import { Outlet } from "./Outlet";
import { Path } from "./Path";
import { PathElement } from "./PathElement";
import { Receiver } from "./Receiver";
import { Situation } from "./Situation";
import { Source } from "./Source";
import { Space } from "./Space";
import { Surface } from "./Surface";

/** Where a part stands: its project and the transaction it is read or changed in. */
export interface Place {
  projectId: string;
  transaction: Transaction;
}

/** A row of any table of parts; the columns of its own beside these follow `columns` below. */
export interface PartRow {
  projectId: string;
  id: string;
  rank: number;
  params: object;
  [column: string]: unknown;
}

export interface Reference {
  field: string;
  to: PartKind;
  /** An owned part goes with the part it points at; one that only uses it holds it. */
  owned: boolean;
}

export interface PartTable {
  model: ModelStatic<Model<PartRow>>;
  /** Its list in a plan, and the segment in an address. Null for the lot: one each. */
  list: Exclude<keyof Plan, "lot"> | null;
  /** The word for one of them in a sentence. */
  word: string;
  /** Fields with a column of their own; the rest is `params`. */
  columns: readonly string[];
  references: readonly Reference[];
}

const owned = (field: string, to: PartKind): Reference => ({ field, to, owned: true });
const used = (field: string, to: PartKind): Reference => ({ field, to, owned: false });

function table(model: unknown, list: PartTable["list"], word: string, columns: string[], references: Reference[]): PartTable {
  // One shape for fourteen classes: each has the columns of PartRow and those it is listed with.
  return { model: model as PartTable["model"], list, word, columns, references };
}

/** What stands where, in the order in which parts may be written: a part comes after all it points at. */
export const partTables: Record<PartKind, PartTable> = {
  lot: table(Lot, null, "lot", [], []),
  building: table(Building, "buildings", "building", ["name"], []),
  space: table(Space, "spaces", "room", ["name", "buildingId"], [used("buildingId", "building")]),
  surface: table(Surface, "surfaces", "surface", ["name", "spaceId"], [owned("spaceId", "space")]),
  source: table(Source, "sources", "source", ["name", "kind", "spaceId"], [used("spaceId", "space")]),
  outlet: table(Outlet, "outlets", "duct mouth", ["name", "sourceId", "spaceId"], [
    owned("sourceId", "source"),
    used("spaceId", "space"),
  ]),
  path: table(Path, "paths", "boundary", ["name", "fromSpaceId", "toSpaceId"], [
    used("fromSpaceId", "space"),
    used("toSpaceId", "space"),
  ]),
  construction: table(Construction, "constructions", "construction", ["name", "catalogueKey"], []),
  element: table(PathElement, "elements", "element", ["name", "kind", "pathId", "constructionId"], [
    owned("pathId", "path"),
    used("constructionId", "construction"),
  ]),
  incidence: table(Incidence, "incidences", "level at an element", ["sourceId", "elementId"], [
    owned("sourceId", "source"),
    owned("elementId", "element"),
  ]),
  fence: table(Fence, "fences", "fence", ["name"], []),
  receiver: table(Receiver, "receivers", "listener", ["name", "kind", "spaceId"], [used("spaceId", "space")]),
  criterion: table(Criterion, "criteria", "limit", ["name", "receiverId"], [owned("receiverId", "receiver")]),
  situation: table(Situation, "situations", "situation", ["name"], []),
};

export const partKinds = Object.keys(partTables) as PartKind[]; // the record is keyed by PartKind

/** The kind an address or a list speaks of: "elements" is the kind element. */
export function partKindOf(segment: string): PartKind | undefined {
  return partKinds.find((kind) => partTables[kind].list === segment || (kind === "lot" && segment === "lots"));
}
