import { limitLevels } from "../lib/noise/criteria";
import { criterionRecords, finishRecords, sourceRecords } from "../lib/noise/library";
import type { PartKind } from "../lib/noise/plan";
import { PartFault } from "./PartFault";

type Values = Record<string, unknown>;

interface Library {
  /** What a record of that key gives a part; undefined where there is none. */
  record: (key: string) => Values | undefined;
  /** Fields that come from the record and from nowhere else. */
  figures: readonly string[];
  /** What stands beside figures that somebody typed over: no longer the record's word. */
  typed: Values;
  /** What is written down with the figures, so that later editions of a table change nothing. */
  freeze?: (values: Values) => Values;
}

const own = { provenance: { document: "Own figures", clause: "", memory: false } };

const libraries: Partial<Record<PartKind, Library>> = {
  source: {
    record: (key) => {
      const found = sourceRecords.find((record) => record.key === key);
      if (!found) return undefined;
      const { kind, name, says, power, deviation, basis, provenance } = found;
      return { kind, name, says, power, deviation, basis, provenance };
    },
    figures: ["power", "deviation", "basis"],
    typed: { ...own, basis: "typed", deviation: null },
  },
  surface: {
    record: (key) => {
      const found = finishRecords.find((record) => record.key === key);
      return found && { finishKey: found.key, alpha: found.alpha, bases: found.bases, provenance: found.provenance };
    },
    figures: ["alpha", "bases", "finishKey"],
    typed: { ...own, finishKey: null, bases: new Array(9).fill("estimated") },
  },
  criterion: {
    record: (key) => {
      const found = criterionRecords.find((record) => record.key === key);
      if (!found) return undefined;
      const { key: _, says: __, ...values } = found;
      return values;
    },
    figures: ["metric", "value", "levels", "edition"],
    typed: own,
    freeze: withLevels,
  },
};

/** A limit by its number keeps the levels that its edition gives it today. */
function withLevels(values: Values): Values {
  const { metric, value, levels = null, edition = "" } = values;
  const numbered = (metric === "NC" || metric === "NR") && typeof value === "number" && typeof edition === "string";
  if (!numbered || levels !== null) return values;
  const curve = Array.from(limitLevels({ metric, value, levels: null, edition }), (level) => (Number.isNaN(level) ? null : level));
  return { ...values, levels: curve };
}

/**
 * What was asked for a part, with the figures of the library's record where one is named (`libraryKey`). Figures that are
 * typed over a record's no longer bear its name: they are own figures, unless the asker says where they were read.
 */
export function filledIn(kind: PartKind, asked: Values): Values {
  const library = libraries[kind];
  if (!library) return asked;
  const { freeze = (values) => values } = library;
  return freeze(filledFrom(library, asked));
}

function filledFrom(library: Library, asked: Values): Values {
  const { libraryKey, ...values } = asked;
  if (libraryKey === undefined) return library.figures.some((field) => field in values) ? { ...library.typed, ...values } : values;
  const typedOver = [...library.figures, "provenance"].filter((field) => field in values);
  const record = typeof libraryKey === "string" ? library.record(libraryKey) : undefined;
  if (!record) throw misfit({ libraryKey: "There is no such record in the library." });
  if (typedOver.length) throw misfit(Object.fromEntries(typedOver.map((field) => [field, "This figure comes from the library’s record."])));
  return { ...record, ...values };
}

const misfit = (fields: Record<string, string>) => new PartFault("invalid", "This value does not fit.", fields);
