import type { z } from "zod";

/** A fault of a document: the reason for the reader and the place in the document, "elements[2].tl". */
export class CaseFault extends Error {
  constructor(
    message: string,
    readonly path: string,
  ) {
    super(message);
  }
}

export type Key = string | number | symbol;

/** A place in a document in words: "elements[2].tl". */
export function pathWords(path: readonly Key[]): string {
  return path.reduce<string>((words, key) => {
    if (typeof key === "number") return `${words}[${key}]`;
    return words === "" ? String(key) : `${words}.${String(key)}`;
  }, "");
}

/** The value of a schema, or the first fault of it. */
export function readWith<T extends z.ZodType>(
  schema: T,
  value: unknown,
  at: readonly Key[] = [],
): z.output<T> {
  const reading = schema.safeParse(value);
  if (reading.success) return reading.data;
  const [issue] = reading.error.issues;
  throw new CaseFault(issue.message, pathWords([...at, ...issue.path]));
}
