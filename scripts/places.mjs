import { mkdirSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";

export const root = fileURLToPath(new URL("..", import.meta.url)).replace(/\/$/, "");

/** What this machine keeps for this checkout: secrets, locks, logs. Others may pass through, not look. */
export const stateFolder = process.env.STILLYARD_STATE ?? join(root, ".stillyard");

/** A file of the state folder, which is made when first asked for. */
export function inState(name) {
  mkdirSync(stateFolder, { recursive: true, mode: 0o711 });
  return join(stateFolder, name);
}
