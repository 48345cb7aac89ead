import { describe, expect, test } from "vitest";
import { BAND_COUNT } from "../../lib/noise/bands";
import { limitLevels } from "../../lib/noise/criteria";
import {
  catalogue,
  criterionLibrary,
  findConstruction,
  finishLibrary,
  sourceLibrary,
} from "../../lib/noise/reference";
import { effectiveLoss } from "../../lib/noise/effective";

describe("the records of data", () => {
  test("are read, with every band or a word that it is unknown", () => {
    for (const { power, shape } of sourceLibrary) expect((power ?? shape)?.length).toBe(BAND_COUNT);
    for (const { alpha, bases } of finishLibrary)
      expect([alpha.length, bases.length]).toEqual([BAND_COUNT, BAND_COUNT]);
  });
  test("of the catalogue each let a known energy pass from 125 Hz to 4 kHz", () => {
    for (const record of catalogue) {
      const { loss } = effectiveLoss({ ...record, id: record.key });
      expect(
        Array.from(loss.slice(2, 8)).filter((each) => !Number.isFinite(each)),
        record.key,
      ).toEqual([]);
    }
  });
  test("are found by their key", () => {
    expect(findConstruction(catalogue[0].key)).toBe(catalogue[0]);
    expect(findConstruction("nowhere")).toBeUndefined();
  });
  test("of NC limits name an edition whose curve can be read", () => {
    for (const { key: _, says: __, ...record } of criterionLibrary.filter(({ metric }) => metric === "NC")) {
      const limits = limitLevels({ ...record, id: "c", receiverId: "r" });
      expect(limits.every(Number.isFinite), record.name).toBe(true);
    }
  });
});
