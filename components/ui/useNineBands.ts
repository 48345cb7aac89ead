import { useState } from "react";
import { BAND_COUNT } from "@/lib/noise/bands";
import { formatQuantity, withUnit } from "../format";
import { withMark, type Figures } from "./figures";
import { figureOf, placePasted, type BandFigure } from "./nineValues";

export interface NineBands {
  values: readonly BandFigure[];
  unit: string;
  min: number;
  max: number;
  /** Whether "silent" is an answer here. */
  silence: boolean;
  mark: Figures["mark"];
  onCommit: (values: BandFigure[]) => void;
}

type Bands<T> = readonly T[];
const replaced = <T,>(list: Bands<T>, at: number, value: T): T[] => list.map((each, i) => (i === at ? value : each));

export const shownFigure = (figure: BandFigure | undefined, mark: Figures["mark"]): string =>
  typeof figure === "number" ? withMark(formatQuantity(figure), mark) : (figure ?? "");

/** What is wrong with a typed cell; undefined where nothing is. */
function refuse(text: string, { min, max, unit, silence }: NineBands): string | undefined {
  const figure = figureOf(text);
  if (figure === undefined || (figure === "silent" && !silence)) return "Type a number, or leave it empty if it is not known.";
  if (typeof figure !== "number" || (figure >= min && figure <= max)) return undefined;
  const most = formatQuantity(max);
  return `Between ${formatQuantity(min)} and ${unit ? withUnit(most, unit) : most}.`;
}

/** What nine fields hold: what is typed, what was handed over, and what is wrong where. Quick typing overtakes no save. */
export function useNineBands(props: NineBands) {
  const { values, mark, onCommit } = props;
  const [stored, setStored] = useState(values);
  /** Handed over last, whether it has come back as `values` or not. */
  const [held, setHeld] = useState(values);
  const [texts, setTexts] = useState<Bands<string>>(() => values.map((value) => shownFigure(value, mark)));
  const [complaints, setComplaints] = useState<Bands<string | undefined>>(() => new Array(BAND_COUNT).fill(undefined));
  const [note, setNote] = useState("");
  if (values.some((value, i) => value !== stored[i])) {
    const moved = values.map((value, i) => value !== stored[i]);
    setStored(values);
    setHeld(held.map((value, i) => (moved[i] ? values[i]! : value)));
    setTexts(texts.map((text, i) => (moved[i] && figureOf(text) !== values[i] ? shownFigure(values[i], mark) : text)));
    setComplaints(complaints.map((complaint, i) => (moved[i] ? undefined : complaint)));
  }

  /** Hands over what is typed, except where it is no figure: there the figure from before stands. */
  function commit(typed: Bands<string> = texts, since: readonly BandFigure[] = held) {
    const wrong = typed.map((text) => refuse(text, props));
    const next = typed.map((text, i) => (wrong[i] === undefined ? figureOf(text)! : held[i]!));
    setComplaints(wrong);
    if (next.every((figure, i) => figure === since[i])) return;
    setHeld(next);
    onCommit(next);
  }

  function type(at: number, text: string): Bands<string> {
    const next = replaced(texts, at, text);
    setTexts(next);
    setNote("");
    return next;
  }

  /** True when the text was several figures and is dealt with. */
  function paste(at: number, text: string): boolean {
    const placed = placePasted(text, at);
    if (!placed) return false;
    if ("refused" in placed) {
      setNote(placed.refused);
      return true;
    }
    const next = texts.map((old, i) => placed.cells[i - placed.from] ?? old).map((cell) => (figureOf(cell) === null ? "" : cell));
    setTexts(next);
    setNote(placed.says);
    commit(next);
    return true;
  }

  return {
    texts,
    complaints,
    note,
    type,
    paste,
    /** When a field is left: what was handed over already is not handed over twice. */
    leave: () => commit(),
    /** On Enter: what has not come back yet, as after a refusal, is handed over again. */
    enter: () => commit(texts, values),
  };
}
