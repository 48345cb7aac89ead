import "server-only";
import { EXPOSURE } from "@/lib/noise/exposure";
import { WEIGHTS } from "@/lib/noise/weighting";

/** What the drawings of a source need besides its own figures, as plain data for a page. */
export const sourceFigures = () => ({ aWeights: Array.from(WEIGHTS.A), exposure: { ...EXPOSURE } });
