import { describe, expect, test } from "vitest";
import { limitLevels } from "../../lib/noise/criteria";
import { effectiveLoss } from "../../lib/noise/effective";
import { describeLayers, massOf } from "../../lib/noise/layers";
import { findMaterial } from "../../lib/noise/materials";
import { sourceKinds } from "../../lib/noise/sources";
import { library, read } from "./records";

const { constructions, sources, finishes, criteria } = library;

describe.each(Object.entries(library))("the records of %s", (_, records) => {
  test("bear a key of their own", () => {
    const keys = records.map(({ key }) => key);
    expect(new Set(keys).size).toBe(keys.length);
  });

  test.each(records.map((record) => [record.key, record] as const))(
    "%s says where it comes from",
    (_key, { provenance }) => {
      expect(provenance.document.length).toBeGreaterThan(4);
      expect(provenance.clause.length).toBeGreaterThan(4);
      if (/from memory/i.test(provenance.clause)) expect(provenance.memory).toBe(true);
      expect(`${provenance.document} ${provenance.clause}`).not.toMatch(
        /https?:|www\.|repositor|transcription/i,
      );
    },
  );
});

describe("constructions", () => {
  test.each(constructions.map((record) => [record.key, record] as const))(
    "%s has a spectrum or layers",
    (key, record) => {
      expect(record.catalogueKey).toBe(key);
      expect(record.fits.length).toBeGreaterThan(0);
      expect(record.tl === null).toBe(record.bases === null);
      expect(record.tl !== null || record.layers.length > 0).toBe(true);
      for (const layer of record.layers) {
        if (layer.kind === "board") expect(findMaterial(layer.material), layer.material).toBeDefined();
        if (layer.kind === "cavity") expect(layer.fill).toBeLessThanOrEqual(layer.thickness);
      }
      if (record.layers.length > 0) expect(describeLayers({ ...record, id: key })).not.toBeNull();
    },
  );

  test("each let a known energy pass from 125 Hz to 4 kHz", () => {
    for (const record of constructions) {
      const { loss } = effectiveLoss({ ...record, id: record.key });
      expect(
        Array.from(loss.slice(2, 8)).filter((each) => !Number.isFinite(each)),
        record.key,
      ).toEqual([]);
    }
  });

  test("call a band without a printed figure estimated, never laboratory", () => {
    for (const { tl, bases } of constructions) {
      tl?.forEach((loss, band) => {
        if (loss === null) expect(bases?.[band]).toBe("estimated");
      });
    }
    const measured = constructions.filter(({ bases }) => bases !== null);
    expect(measured.length).toBeGreaterThan(10);
    for (const { bases } of measured)
      expect(bases?.filter((basis) => basis === "laboratory").length).toBeGreaterThanOrEqual(6);
  });

  test("offer at least three builds for every kind of element that is made of one", () => {
    for (const kind of ["wall", "roof", "door", "window"] as const) {
      expect(constructions.filter(({ fits }) => fits.includes(kind)).length).toBeGreaterThanOrEqual(3);
    }
    for (const kind of ["floor", "ceiling"] as const) {
      expect(constructions.filter(({ fits }) => fits.includes(kind)).length).toBeGreaterThanOrEqual(2);
    }
  });

  // Sums of density times thickness by hand: 1350 x 0.009 + 620 x 0.012, and 3 x 750 x 0.018.
  test("weigh what their boards weigh", () => {
    const outer = constructions.find(({ key }) => key === "wall-fibre-cement-double-205");
    const boards = outer?.layers.slice(0, 2) ?? [];
    expect(massOf({ ...outer!, id: "outer", layers: boards })).toBeCloseTo(19.59, 6);
    const heavy = constructions.find(({ key }) => key === "door-mdf-3x18-damped");
    expect(massOf({ ...heavy!, id: "heavy" })).toBeCloseTo(40.5, 6);
    expect(heavy?.suggested).toEqual({ gapArea: 0.0003 });
  });
});

describe("sources", () => {
  test.each(sources.map((record) => [record.key, record] as const))(
    "%s has a doubt wherever it has a level",
    (_key, record) => {
      expect(Object.keys(sourceKinds)).toContain(record.kind);
      expect(record.basis).toBe("estimated");
      if (record.power === null) return expect(record.shape).toHaveLength(9);
      record.power.forEach((level, band) => expect(record.deviation?.[band] === null).toBe(level === null));
      expect(record.power.some((level) => level !== null)).toBe(true);
    },
  );
});

describe("finishes", () => {
  test.each(finishes.map((record) => [record.key, record] as const))(
    "%s marks what was filled",
    (_key, { alpha, bases }) => {
      expect(alpha).not.toContain(null);
      expect(alpha.slice(0, 2)).toEqual([alpha[2], alpha[2]]);
      expect(alpha[8]).toBe(alpha[7]);
      expect(bases.map((basis) => basis === "estimated")).toEqual(
        [0, 1, 2, 3, 4, 5, 6, 7, 8].map((band) => band < 2 || band === 8),
      );
    },
  );
});

describe("criteria", () => {
  test.each(criteria.map((record) => [record.key, record] as const))(
    "%s is a figure or a curve",
    (_key, record) => {
      if (record.metric === "curve") expect(record.levels).toHaveLength(9);
      else expect(record.value).toEqual(expect.any(Number));
      if (record.metric === "NC") expect(nameOfEditions()).toContain(record.edition);
    },
  );

  test("of NC can be read as a curve in every band", () => {
    const curves = criteria.filter(({ metric }) => metric === "NC");
    expect(curves.length).toBeGreaterThan(0);
    for (const { key: id, says: _, ...record } of curves)
      expect(limitLevels(record).every(Number.isFinite), id).toBe(true);
  });

  test("hold the demo's limit in bed as it was agreed", () => {
    expect(criteria.find(({ key }) => key === "demo-no9-night")?.levels).toEqual([
      49, 42, 38, 33, 27, 23, 20, 18, 16,
    ]);
  });
});

function nameOfEditions(): string[] {
  return (read("curves.json") as { nc: { key: string }[] }).nc.map(({ key }) => key);
}
