/** A fault the reader can mend: printed as one sentence, without a trace. */
export class Sentence extends Error {}

/** Ends the process the way its fault deserves. */
export function tellFault(fault) {
  console.error(fault instanceof Sentence ? fault.message : fault);
}
