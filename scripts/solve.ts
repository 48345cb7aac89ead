import { readFileSync } from "node:fs";
import { answerCase, CaseFault } from "../lib/noise/caseDocument";

/** Headless solve: one case document in (a file, or "-" for standard input), one answer out. */
function readDocument(name: string | undefined): unknown {
  if (!name) throw new CaseFault('name a file, or "-" for standard input', "");
  try {
    return JSON.parse(readFileSync(name === "-" ? 0 : name, "utf8"));
  } catch (error) {
    throw new CaseFault(error instanceof Error ? error.message : "the file cannot be read", "");
  }
}

try {
  process.stdout.write(`${JSON.stringify(answerCase(readDocument(process.argv[2])), null, 1)}\n`);
} catch (error) {
  const message = error instanceof Error ? error.message : "the document cannot be solved";
  process.stderr.write(
    `${JSON.stringify({ error: { message, path: error instanceof CaseFault ? error.path : "" } })}\n`,
  );
  process.exitCode = 1;
}
