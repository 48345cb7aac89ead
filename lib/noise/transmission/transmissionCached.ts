import type { Description } from "./description";
import { transmissionOf, type Transmission } from "./transmissionOf";

const MOST_KEPT = 500;
const kept = new Map<string, Transmission>();

/** As `transmissionOf`, remembered by the content of the description; the one unused longest is forgotten first. */
export function transmissionCached(description: Description): Transmission {
  const key = JSON.stringify(description);
  const found = kept.get(key) ?? transmissionOf(description);
  kept.delete(key);
  kept.set(key, found);
  if (kept.size > MOST_KEPT) kept.delete(kept.keys().next().value!);
  return found;
}
