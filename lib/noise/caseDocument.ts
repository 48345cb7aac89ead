import { answerDescription, answerReceiver, answerSpectrum } from "./caseDocument/answer";
import { bandLengthOf } from "./caseDocument/bandLength";
import { CaseFault, readWith } from "./caseDocument/fault";
import { checkReferences } from "./caseDocument/references";
import { budgetSchema, constructionsSchema, spectraSchema } from "./caseDocument/schema";
import { planOfBudget } from "./caseDocument/toPlan";
import type { Plan } from "./plan";
import { solve } from "./solve";

export { CaseFault } from "./caseDocument/fault";

/** The plan of a case document with receivers. Throws `CaseFault` with the reason and the place in the document. */
export function readBudget(document: unknown): { plan: Plan; length: number } {
  const length = bandLengthOf(document);
  const budget = readWith(budgetSchema, document);
  checkReferences(budget);
  return { plan: planOfBudget(budget), length };
}

function mapValues<T>(record: Record<string, T>, answer: (value: T) => unknown): Record<string, unknown> {
  return Object.fromEntries(Object.entries(record).map(([name, value]) => [name, answer(value)]));
}

function answerBudget(document: unknown): Record<string, unknown> {
  const { plan, length } = readBudget(document);
  const { receivers } = solve(plan, { contributions: Infinity });
  return Object.fromEntries(
    receivers.map((verdict) => [verdict.receiverId, answerReceiver(verdict, length)]),
  );
}

/**
 * The answer of a case document: a budget per receiver, transmission loss per construction, or ratings per spectrum.
 * Throws `CaseFault` for what is malformed, names nothing, or is not built.
 */
export function answerCase(document: unknown): Record<string, unknown> {
  if (typeof document !== "object" || document === null || Array.isArray(document))
    throw new CaseFault("a case document is one object", "");
  if ("receivers" in document) return answerBudget(document);
  if ("constructions" in document) {
    return mapValues(readWith(constructionsSchema, document).constructions, ({ construction }) =>
      answerDescription(construction),
    );
  }
  if ("tl" in document)
    throw new CaseFault("single-number ratings of transmission loss are not built yet", "tl");
  if ("spectra" in document) {
    bandLengthOf(document);
    return mapValues(readWith(spectraSchema, document).spectra, ({ levels }) => answerSpectrum(levels));
  }
  throw new CaseFault("the document has neither receivers nor constructions nor spectra", "");
}
