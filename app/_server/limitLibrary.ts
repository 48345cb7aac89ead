import "server-only";
import { CURVE_EDITIONS } from "@/lib/noise/criteria";
import { WEIGHTS } from "@/lib/noise/weighting";
import { OCTAVE_BANDS } from "@/lib/noise/bands";
import { criterionLibrary } from "./library";

/** Records of the demo's own yards: they belong to its story and to no other yard. */
const OF_THE_DEMO = "demo-";
const KICK = OCTAVE_BANDS.indexOf(63);

/** What a limit may be copied from or read in, as plain data for a page. */
export const limitLibrary = () => ({
  records: criterionLibrary().filter(({ key }) => !key.startsWith(OF_THE_DEMO)),
  editions: CURVE_EDITIONS,
  /** What one figure makes of the bass, dB at 63 Hz: IEC 61672-1:2013, Table 3. */
  at63: { dBA: WEIGHTS.A[KICK], dBC: WEIGHTS.C[KICK] },
});
