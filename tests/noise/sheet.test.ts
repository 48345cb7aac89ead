import { describe, expect, it } from "vitest";
import catalogue from "@/data/constructions.json";
import plumtree from "@/data/examples/plumtree-row.json";
import { constructionSchema, type Construction } from "@/lib/noise/construction";
import { catalogueSheets } from "@/lib/noise/catalogueSheets";
import type { PathElement } from "@/lib/noise/elements";
import { planSchema } from "@/lib/noise/plan";
import { sheetOf } from "@/lib/noise/sheet";

const records = catalogue.records.map((record) => constructionSchema.parse({ ...record, id: record.key }));
const find = (key: string) => records.find(({ id }) => id === key)!;

function buildConstruction(
  cavity: Partial<Extract<Construction["layers"][number], { kind: "cavity" }>>,
  fits: Construction["fits"] = ["wall"],
) {
  const board = { kind: "board", name: "Board", material: "osb", thickness: 0.012 };
  const layers = [
    board,
    { kind: "cavity", name: "Space", thickness: 0.1, fill: 0, connection: "none", ...cavity },
    board,
  ];
  return constructionSchema.parse({
    id: "built",
    name: "Built",
    fits,
    catalogueKey: null,
    layers,
    tl: null,
    bases: null,
    provenance: { document: "test" },
  });
}

const middle = (construction: Construction) => sheetOf(construction).layers.slice(1, -1);

describe("the sheet of a construction", () => {
  it("splits a double row of studs into its two rows and the gap that stays clear", () => {
    const rows = sheetOf(find("wall-fibre-cement-double-205")).layers;
    expect(rows.map(({ name }) => name)).toEqual([
      "Fibre cement cladding",
      "Sheathing board",
      "Studs 90 × 45, wool between",
      "Gap, kept clear",
      "Studs 90 × 45, wool between",
      "Plasterboard, dense",
      "Plasterboard, dense",
    ]);
    expect(rows[3]!.thickness).toBeCloseTo(0.025, 9);
  });

  it.each(records.map((record) => [record.id, record] as const))(
    "%s: rows add up to its thickness and its mass",
    (_, record) => {
      const sheet = sheetOf(record);
      const sum = (values: (number | null)[]) =>
        values.reduce<number>((total, value) => total + (value ?? 0), 0);
      if (sheet.thickness !== null)
        expect(sum(sheet.layers.map(({ thickness }) => thickness))).toBeCloseTo(sheet.thickness, 9);
      if (sheet.surfaceMass !== null && record.layers.length > 0)
        expect(sum(sheet.layers.map(({ surfaceMass }) => surfaceMass))).toBeCloseTo(sheet.surfaceMass, 9);
      expect(sheet.loss).toHaveLength(9);
      expect(JSON.parse(JSON.stringify(sheet))).toEqual(sheet);
    },
  );

  it("gives a damped board its compound, which has no thickness of its own", () => {
    const rows = sheetOf(find("door-mdf-3x18-damped")).layers;
    expect(rows.map(({ look }) => look)).toEqual([
      "sheathing",
      "compound",
      "sheathing",
      "compound",
      "sheathing",
    ]);
    expect(rows[1]!.thickness).toBeNull();
  });

  it("puts the wool into the row of studs first and only then into the space behind it", () => {
    const studs = [{ depth: 0.08, width: 0.045 }];
    const filled = middle(buildConstruction({ fill: 0.09, studs, connection: "resilient_channel" }));
    expect(filled.map(({ name, fill }) => [name, fill])).toEqual([
      ["Studs 80 × 45, wool between", 0.08],
      ["Resilient channel, 10 mm of wool", expect.closeTo(0.01, 9)],
    ]);
    const half = middle(buildConstruction({ fill: 0.05, studs }));
    expect(half[0]!.name).toBe("Studs 80 × 45, 50 mm of wool");
  });

  it("stands staggered studs in one row, each against its own leaf", () => {
    const [row, ...others] = middle(
      buildConstruction({ connection: "staggered", studs: [{ depth: 0.07, width: 0.045 }] }),
    );
    expect(others).toEqual([]);
    expect(row!.studs.map(({ against }) => against)).toEqual(["yard", "room"]);
  });

  it("calls the timber of a roof rafters and joists", () => {
    const studs = [
      { depth: 0.05, width: 0.045 },
      { depth: 0.04, width: 0.045 },
    ];
    const names = middle(buildConstruction({ connection: "double_stud", studs }, ["roof"])).map(
      ({ name }) => name,
    );
    expect(names).toEqual(["Rafters 50 × 45, no wool", "Gap, kept clear", "Joists 40 × 45, no wool"]);
  });

  it("marks a mass that was recalled and not read", () => {
    expect(sheetOf(buildConstruction({})).layers[0]!.whereFrom).toBe("typical, from memory");
  });

  it("says of which bands nothing is known, without a number in their place", () => {
    const { loss } = sheetOf(find("door-metal-two-skins-35"));
    expect(loss[0]).toBe("unknown");
    expect(loss[1]).toBe("unknown");
    expect(typeof loss[2]).toBe("number");
  });
});

describe("the catalogue in the place of an element", () => {
  const door = planSchema.parse(plumtree).elements.find(({ id }) => id === "yard-door")!;
  const hung = (element: PathElement) =>
    Object.fromEntries(catalogueSheets(element).map((sheet) => [sheet.key, sheet.hung!]));

  it("holds only what fits", () => {
    expect(Object.keys(hung(door)).every((key) => key.startsWith("door-"))).toBe(true);
  });

  it("reckons with the gap that the heavy door brings: 3 cm² in 1.89 m²", () => {
    // Figures of the worked demo lot, independent of this program.
    const wanted = [26.7, 27.6, 29.9, 33.2, 35.5];
    hung(door)
      ["door-mdf-3x18-damped"]!.slice(0, 5)
      .forEach((loss, band) => expect(Math.abs((loss as number) - wanted[band]!)).toBeLessThan(0.1));
  });

  it("never stops more with an opening than without", () => {
    catalogueSheets(door).forEach(({ hung: open, loss }) =>
      loss.forEach((shut, band) => {
        if (typeof shut === "number") expect(open![band]).toBeLessThanOrEqual(shut + 1e-9);
        else expect(open![band]).toBe("unknown");
      }),
    );
  });
});
