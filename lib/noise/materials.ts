import { z } from "zod";
import table from "../../data/materials.json";

/** One record of the table of materials: density kg/m³, Young's modulus Pa, the rest without unit. */
const materialSchema = z.strictObject({
  name: z.string().regex(/^[a-z_]+$/),
  label: z.string().min(1),
  family: z.enum(["gypsum", "wood", "board", "glass", "masonry", "metal", "coating", "limp"]),
  density: z.number().min(1).max(25_000).meta({ label: "Density", unit: "kg/m³" }),
  youngsModulus: z.number().min(1e5).max(1e12).meta({ label: "Young's modulus", unit: "Pa" }),
  poissonRatio: z.number().min(0).max(0.49).meta({ label: "Poisson's ratio", unit: "" }),
  lossFactor: z.number().min(0).max(1).meta({ label: "Loss factor", unit: "" }),
  basis: z.literal("estimated"),
  source: z.string().min(1),
});

/** Elastic data of a board or sheet. */
export type Material = z.output<typeof materialSchema>;

/** Every material a ply may be named by, in the order of the table. */
export const materials: readonly Material[] = z.array(materialSchema).nonempty().parse(table.records);

const materialsByName = new Map(materials.map((material) => [material.name, material]));

/** The record of that name; `undefined` when the table has none. */
export function findMaterial(name: string): Material | undefined {
  return materialsByName.get(name);
}
