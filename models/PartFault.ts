/** Why a part could not be read or changed: in words for the reader, and per field where a field is to blame. */
export class PartFault extends Error {
  constructor(
    readonly reason: "missing" | "invalid" | "held",
    message: string,
    readonly fields: Record<string, string> = {},
  ) {
    super(message);
  }
}
