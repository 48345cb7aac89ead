import { useState } from "react";

type Figure = string | number | null | undefined;

/** Units of the reader turn a figure there and back; what differs by less is the same figure. */
const TINY = 1e-9;

const same = (one: Figure, other: Figure): boolean =>
  typeof one === "number" && typeof other === "number"
    ? Math.abs(one - other) <= TINY * Math.max(1, Math.abs(one))
    : (one ?? null) === (other ?? null);

/**
 * The text of a field that saves when it is left. What was handed over and has not come back yet counts as standing: the
 * old value typed back meanwhile is a change too, and what is being typed is never overwritten by an answer.
 */
export function useTyped<T extends Figure>(value: T, show: (value: T) => string) {
  const [stored, setStored] = useState(value);
  const [text, setText] = useState(show(value));
  const [typing, setTyping] = useState(false);
  /** Handed over and not yet come back as `value`, oldest first. */
  const [sent, setSent] = useState<readonly T[]>([]);
  /** Left without a change since it was handed over last: once more is a new try. */
  const [visited, setVisited] = useState(false);
  const came = !Object.is(stored, value);
  if (came) {
    const at = sent.findIndex((figure) => same(figure, value));
    setStored(value);
    setSent(at < 0 ? [] : sent.slice(at + 1));
    if (!typing && at < 0) setText(show(value)); // what was handed over stands here as it was typed
  }
  return {
    text,
    came,
    visit: () => setVisited(true),
    type(words: string) {
      setText(words);
      setTyping(true);
    },
    /** What was typed is done with; true where it is to be saved. */
    hand(figure: T): boolean {
      const standing = sent.length > 0 ? sent.at(-1) : value;
      const again = visited && sent.length > 0;
      setTyping(false);
      setVisited(false);
      if (typeof figure === "string") setText(figure);
      if (same(figure, standing) && !again) return false;
      setSent([...sent, figure]);
      return true;
    },
  };
}
