// Longer than most: one schema for one document, and its parts are of no use alone.
import { z } from "zod";
import { findMaterial } from "../materials";

const MASS_LIMITS = { least: 0.01, most: 2000 };

/** Runs the schema chosen by the shape of the value, so that a fault keeps its path instead of "no alternative fits". */
function choose<T extends z.ZodType>(pick: (value: unknown) => T) {
  return z.unknown().transform((value, context): z.output<T> => {
    const result = pick(value).safeParse(value);
    if (result.success) return result.data;
    for (const issue of result.error.issues) {
      context.issues.push({ code: "custom", message: issue.message, path: [...issue.path], input: value });
    }
    return z.NEVER;
  });
}

function has(value: unknown, key: string): boolean {
  return typeof value === "object" && value !== null && key in value;
}

const lossFactor = z.number().min(0).max(1).meta({ label: "Loss factor", unit: "" });

const namedMaterial = z.string().refine((name) => findMaterial(name) !== undefined, {
  error: ({ input }) => `no material is called "${String(input).slice(0, 40)}"`,
});

const ownMaterial = z.strictObject({
  rho: z.number().min(1).max(25_000).meta({ label: "Density", unit: "kg/m³" }),
  E: z.number().min(1e5).max(1e12).meta({ label: "Young's modulus", unit: "Pa" }),
  nu: z.number().min(0).max(0.49).meta({ label: "Poisson's ratio", unit: "" }),
  eta: lossFactor,
});

const material = choose<typeof namedMaterial | typeof ownMaterial>((value) =>
  typeof value === "string" ? namedMaterial : ownMaterial,
);

const thickness = z.number().min(1e-5).max(2).meta({ label: "Thickness", unit: "m" });

const pliedLeaf = z
  .strictObject({
    plies: z
      .array(z.tuple([material, thickness]))
      .min(1)
      .max(12),
    bond: z.enum(["screwed", "glued", "damped"]).default("screwed").meta({ label: "Bond" }),
    eta: lossFactor.optional(),
  })
  .refine(
    ({ plies }) => plies.length === 0 || isMassAllowed(plies.reduce((sum, ply) => sum + plyMass(ply), 0)),
    {
      path: ["plies"],
      error: `the surface mass must lie between ${MASS_LIMITS.least} and ${MASS_LIMITS.most} kg/m²`,
    },
  );

const ratedLeaf = z.strictObject({
  m: z.number().min(MASS_LIMITS.least).max(MASS_LIMITS.most).meta({ label: "Surface mass", unit: "kg/m²" }),
  fc: z.number().min(1).max(1e6).meta({ label: "Critical frequency", unit: "Hz" }),
  eta: lossFactor,
});

/** One leaf: plies in contact, outermost first, or mass and critical frequency where only these are known. */
export const leafSchema = choose<typeof pliedLeaf | typeof ratedLeaf>((value) =>
  has(value, "m") || has(value, "fc") ? ratedLeaf : pliedLeaf,
);

function plyMass([of, depth]: [z.output<typeof material>, number]): number {
  const density = typeof of === "string" ? (findMaterial(of)?.density ?? NaN) : of.rho;
  return density * depth;
}

function isMassAllowed(mass: number): boolean {
  return mass >= MASS_LIMITS.least && mass <= MASS_LIMITS.most;
}

function line<K extends string>(kind: K, spacing: number) {
  return z.strictObject({
    kind: z.literal(kind),
    spacing: z.number().min(0.05).max(10).default(spacing).meta({ label: "Spacing", unit: "m" }),
  });
}

const clips = z.strictObject({
  kind: z.literal("clips"),
  n: z
    .number()
    .min(0.01)
    .max(100)
    .default(1 / (0.61 * 1.22))
    .meta({ label: "Clips", unit: "1/m²" }),
});

/** What joins the two leaves, with the usual spacings (m) filled in. */
export const connectionSchema = z.discriminatedUnion("kind", [
  line("wood_stud", 0.406),
  line("steel_stud", 0.61),
  line("resilient_channel", 0.61),
  line("staggered", 0.406),
  line("double_stud", 0.406),
  clips,
  z.strictObject({ kind: z.literal("none"), spacing: z.number().optional() }),
]);

const side = z.number().min(0.01).max(1000);
const size = z.tuple([side, side]).meta({ label: "Size", unit: "m" });

const single = z.strictObject({ kind: z.literal("single"), leaf: leafSchema, size: size.optional() });

const double = z
  .strictObject({
    kind: z.literal("double"),
    leaf1: leafSchema,
    leaf2: leafSchema,
    cavity: z.number().min(0.0001).max(5).meta({ label: "Cavity", unit: "m" }),
    fill: z.number().min(0).max(5).default(0).meta({ label: "Fill", unit: "m" }),
    flow_resistivity: z
      .number()
      .min(100)
      .max(1e6)
      .default(5000)
      .meta({ label: "Flow resistivity", unit: "N s/m⁴" }),
    connection: connectionSchema.optional(),
    use: z.literal("window").optional(),
    size: size.optional(),
  })
  // 1e-9: a fill entered as the very cavity must not fail on the last binary digit.
  .refine(({ cavity, fill }) => fill <= cavity + 1e-9, {
    path: ["fill"],
    error: "the fill cannot be thicker than the cavity",
  })
  .refine(({ connection, use }) => connection !== undefined || use === "window", {
    path: ["connection"],
    error: 'say what joins the two leaves; separate structures are "none"',
  });

/**
 * A layered construction as the user describes it: one leaf, or two leaves with a cavity. SI units.
 * Faults carry the path of the field and the reason in words. Source: the case document, section 2.
 */
export const descriptionSchema = z.discriminatedUnion("kind", [single, double], {
  error: ({ input }) =>
    has(input, "kind") && (input as { kind: unknown }).kind === "layered"
      ? "three and more leaves are not built yet"
      : undefined,
});

export type Description = z.output<typeof descriptionSchema>;
export type DoubleDescription = z.output<typeof double>;
export type LeafDescription = z.output<typeof leafSchema>;
export type PliedLeafDescription = z.output<typeof pliedLeaf>;
export type Connection = z.output<typeof connectionSchema>;
export type PlyMaterial = z.output<typeof material>;
