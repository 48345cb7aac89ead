import { z } from "zod";
import { BAND_COUNT, OCTAVE_BANDS } from "./bands";

/** One band as it is stored and sent: a number, silence, or (null) not known. */
const bandValue = (low: number, high: number) =>
  z.union([z.number().min(low).max(high), z.literal("silent"), z.null()]);

const overBands = (low: number, high: number) => z.array(bandValue(low, high)).length(BAND_COUNT);

/** Sound pressure or sound power levels over the nine bands, dB. */
export const levelSpectrum = overBands(-100, 160);
/** Transmission loss over the nine bands, dB. "silent" means that nothing passes. */
export const lossSpectrum = overBands(-20, 150);
/** Absorption areas over the nine bands, m2. */
export const areaSpectrum = z.array(z.union([z.number().min(0.01).max(10_000), z.null()])).length(BAND_COUNT);
/** Absorption areas of things in a room over the nine bands, m2; a thing may take nothing in a band. */
export const objectAreaSpectrum = z
  .array(z.union([z.number().min(0).max(10_000), z.null()]))
  .length(BAND_COUNT);
/** Decay times over the nine bands, s. */
export const decaySpectrum = z.array(z.union([z.number().min(0.02).max(30), z.null()])).length(BAND_COUNT);
/** Absorption coefficients over the nine bands. Laboratory values above 1 are as printed. */
export const coefficientSpectrum = z
  .array(z.union([z.number().min(0).max(1.5), z.null()]))
  .length(BAND_COUNT);
/** Standard deviations over the nine bands, dB. */
export const deviationSpectrum = z.array(z.union([z.number().min(0).max(30), z.null()])).length(BAND_COUNT);

/** The bands that a record of figures names beside them, Hz: all nine, in their order. */
export const bandsSchema = z
  .array(z.number())
  .length(BAND_COUNT)
  .refine((bands) => bands.every((band, i) => band === OCTAVE_BANDS[i]));

export type Spectrum = z.infer<typeof levelSpectrum>;

/** From the stored form to the form for arithmetic: silence is -Infinity, unknown is NaN. */
export function toArithmetic(spectrum: readonly (number | "silent" | null)[]): Float64Array {
  return Float64Array.from(spectrum, (value) =>
    value === null ? NaN : value === "silent" ? -Infinity : value,
  );
}

/** What a figure rests on, strongest first. */
export const BASES = ["measured", "laboratory", "calculated", "estimated"] as const;
export type Basis = (typeof BASES)[number];
export const basisSchema = z.enum(BASES);
export const basesSchema = z.array(basisSchema).length(BAND_COUNT);

/** Where a figure was read. `memory` marks a value recalled rather than read; the reader sees the mark. */
export const provenanceSchema = z.object({
  document: z.string().min(1).max(400),
  clause: z.string().max(400).default(""),
  memory: z.boolean().default(false),
});
export type Provenance = z.infer<typeof provenanceSchema>;
