/** A fault the reader can mend: printed as one sentence, without a trace. */
export class Sentence extends Error {}

/** What the machine refuses and the reader can mend. */
const mendable = {
  ENOSPC: (fault) => `The disk is full${placeOf(fault)}: free some space and start again.`,
  EDQUOT: (fault) => `The space this account may use is full${placeOf(fault)}: free some and start again.`,
  EACCES: (fault) => `This account may not write${placeOf(fault)}: start from a folder of its own, or let it.`,
  EROFS: (fault) => `Nothing can be written${placeOf(fault)}: start from a folder on a disk that takes writing.`,
};

const placeOf = ({ path }) => (path ? ` at ${path}` : "");

/** Prints a fault the way it deserves: what the reader can mend as one sentence, anything else whole. */
export function tellFault(fault) {
  const words = fault instanceof Sentence ? fault.message : mendable[fault?.code]?.(fault);
  console.error(words ?? fault);
}
