import clsx from "clsx";
import { marginWords, type Figure, type State } from "../format";
import { StatusMark } from "./StatusMark";

export const stateColour: Record<State, string> = {
  under: "text-under",
  tight: "text-tight",
  over: "text-over",
  "not weighed": "text-ink3",
};

interface Props {
  state: State;
  margin?: Figure;
  /** Other words than those of the margin, as in a legend. */
  children?: React.ReactNode;
  className?: string;
}

/** The mark with its words: "3 dB over", "1 dB under, tight", "not weighed". */
export function MarginWords({ state, margin, children, className }: Props) {
  return (
    <span className={clsx("inline-flex items-center gap-[7px] font-[650]", stateColour[state], className)}>
      <StatusMark state={state} />
      <span>{children ?? marginWords(state, margin)}</span>
    </span>
  );
}
