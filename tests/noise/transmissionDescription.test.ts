import { describe, expect, test } from "vitest";
import { findMaterial, materials } from "../../lib/noise/materials";
import { descriptionSchema } from "../../lib/noise/transmission";

const board = { plies: [["gypsum", 0.0127]] };
const wall = { kind: "double", leaf1: board, leaf2: board, cavity: 0.09, connection: { kind: "wood_stud" } };
const single = (leaf: unknown) => ({ kind: "single", leaf });
const own = { rho: 1000, E: 1e9, nu: 0.2, eta: 0.01 };

function faultsOf(given: unknown): string[] {
  const result = descriptionSchema.safeParse(given);
  return (result.error?.issues ?? []).map(({ path, message }) => `${path.join(".")}: ${message}`);
}

describe("the description of a construction", () => {
  test("fills in the usual bond, spacing, fill and wool", () => {
    expect(descriptionSchema.parse(wall)).toEqual({
      kind: "double",
      leaf1: { plies: [["gypsum", 0.0127]], bond: "screwed" },
      leaf2: { plies: [["gypsum", 0.0127]], bond: "screwed" },
      cavity: 0.09,
      fill: 0,
      flow_resistivity: 5000,
      connection: { kind: "wood_stud", spacing: 0.406 },
    });
  });

  test.each([
    ["wood_stud", 0.406],
    ["steel_stud", 0.61],
    ["resilient_channel", 0.61],
    ["staggered", 0.406],
    ["double_stud", 0.406],
  ])("spaces %s at %d m", (kind, spacing) => {
    expect(descriptionSchema.parse({ ...wall, connection: { kind } })).toHaveProperty("connection", {
      kind,
      spacing,
    });
  });

  test("counts clips per area", () => {
    const parsed = descriptionSchema.parse({ ...wall, connection: { kind: "clips" } });
    expect(parsed).toHaveProperty("connection.n", 1 / (0.61 * 1.22));
  });

  test("takes a leaf by mass and critical frequency, and a material by its data", () => {
    expect(faultsOf(single({ m: 8, fc: 900, eta: 0.05 }))).toEqual([]);
    expect(faultsOf(single({ plies: [[own, 0.01]] }))).toEqual([]);
  });

  test.each<[string, unknown, RegExp]>([
    ["three leaves", { kind: "layered", layers: [] }, /^kind: three and more leaves are not built yet$/],
    ["another kind", { kind: "hollow" }, /^kind: /],
    ["nothing at all", null, /^: /],
    [
      "an unknown material",
      single({ plies: [["gypsumm", 0.01]] }),
      /^leaf\.plies\.0\.0: no material is called "gypsumm"$/,
    ],
    [
      "a material without stiffness",
      single({ plies: [[{ ...own, E: NaN }, 0.01]] }),
      /^leaf\.plies\.0\.0\.E: /,
    ],
    ["no plies", single({ plies: [] }), /^leaf\.plies: /],
    ["13 plies", single({ plies: Array(13).fill(["gypsum", 0.01]) }), /^leaf\.plies: /],
    [
      "a board of no thickness",
      single({
        plies: [
          ["gypsum", 0.01],
          ["gypsum", 0],
        ],
      }),
      /^leaf\.plies\.1\.1: /,
    ],
    ["a board of infinite thickness", single({ plies: [["gypsum", Infinity]] }), /^leaf\.plies\.0\.1: /],
    [
      "plies too heavy",
      single({ plies: [["steel", 1]] }),
      /^leaf\.plies: the surface mass must lie between 0\.01 and 2000/,
    ],
    ["a mass too small", single({ m: 0.005, fc: 900, eta: 0.05 }), /^leaf\.m: /],
    ["half a leaf", single({ m: 8, eta: 0.05 }), /^leaf\.fc: /],
    ["a slip of the pen", single({ ...board, bonding: "glued" }), /^leaf: .*bonding/],
    ["more fill than cavity", { ...wall, fill: 0.1 }, /^fill: the fill cannot be thicker than the cavity$/],
    ["an unknown connection", { ...wall, connection: { kind: "nails" } }, /^connection\.kind: /],
    [
      "studs on top of each other",
      { ...wall, connection: { kind: "wood_stud", spacing: 0 } },
      /^connection\.spacing: /,
    ],
    ["leaves with nothing said between", { ...wall, connection: undefined }, /^connection: say what joins/],
    ["a size of one side", { ...wall, size: [3] }, /^size/],
  ])("refuses %s with its place and reason", (_, given, fault) => {
    const faults = faultsOf(given);
    expect(faults).toHaveLength(1);
    expect(faults[0]).toMatch(fault);
  });
});

describe("the table of materials", () => {
  test("names each material once and says where it comes from", () => {
    expect(new Set(materials.map(({ name }) => name)).size).toBe(materials.length);
    for (const { source } of materials) expect(source).toMatch(/^from memory: /);
    expect(materials.filter(({ source }) => source.includes("fitted")).map(({ name }) => name)).toEqual([
      "gypsum",
      "gypsum_x",
      "gypsum_dense",
    ]);
    expect(findMaterial("paper")).toBeUndefined();
  });

  // Typed from the table of section 2.1 of the solver method: density, Young's modulus in GPa, Poisson's ratio, loss factor.
  test.each([
    ["gypsum_dense", 900, 3.2, 0.25, 0.03],
    ["osb", 620, 4.8, 0.25, 0.03],
    ["fibre_cement", 1350, 8, 0.25, 0.02],
    ["concrete", 2300, 28, 0.2, 0.012],
    ["mlv", 2000, 0.005, 0.45, 0.3],
    ["roof_shingle", 1100, 0.05, 0.4, 0.2],
  ])("knows %s", (name, density, modulus, poissonRatio, lossFactor) => {
    expect(findMaterial(name)).toMatchObject({
      density,
      youngsModulus: modulus * 1e9,
      poissonRatio,
      lossFactor,
    });
  });
});
