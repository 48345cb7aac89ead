import { createHash } from "node:crypto";

/** The id of a thing of the demo: the same at every seeding, so that an address can be written down. */
export function idOf(...names: string[]): string {
  const bytes = createHash("sha256").update(["demo", ...names].join("/")).digest().subarray(0, 16);
  // The marks of a version 8 id (RFC 9562): made by a rule of one's own.
  bytes[6] = (bytes[6]! & 0x0f) | 0x80;
  bytes[8] = (bytes[8]! & 0x3f) | 0x80;
  return bytes.toString("hex").replace(/^(.{8})(.{4})(.{4})(.{4})/, "$1-$2-$3-$4-");
}
