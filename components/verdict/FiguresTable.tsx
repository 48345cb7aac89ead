import clsx from "clsx";
import { oneDecimal, percent, spokenFigure, wholeDecibels } from "../format";
import { stateColour } from "../marks/MarginWords";
import { StatusMark } from "../marks/StatusMark";
import { VisuallyHidden } from "../ui/VisuallyHidden";
import type { Column } from "./columns";

interface Props {
  columns: readonly Column[];
  lit: Column;
  /** The unit of a weighted limit; null where each band has its own. */
  counting: string | null;
  onBand: (column: Column) => void;
}

interface Line {
  words: string;
  write: (column: Column) => string;
  speak: (column: Column) => string;
  judged?: boolean;
}

const orNothing = (value: number | null, write: (value: number) => string) => (value === null ? "" : write(value));

/** Where a part is unknown, the figures of the known parts are only a bound. */
const bound = ({ level: figure }: Column, words: string) => (figure === "unknown" ? words : "");

const boundOfMargin = (column: Column, words: string) => (typeof column.margin === "number" ? bound(column, words) : "");

const level: Line = { words: "Level, dB", write: ({ level: figure }) => wholeDecibels(figure), speak: ({ level: figure }) => spokenFigure(figure) };
const limit: Line = { words: "Limit, dB", write: ({ limit: figure }) => orNothing(figure, wholeDecibels), speak: ({ limit: figure }) => orNothing(figure, spokenFigure) };
const roomLeft: Line = {
  words: "Room left",
  write: (column) => (column.margin === null ? "" : boundOfMargin(column, "≤") + oneDecimal(column.margin)),
  speak: (column) => (column.margin === null ? "" : boundOfMargin(column, "at most ") + spokenFigure(column.margin, 1)),
  judged: true,
};
const spent: Line = {
  words: "Spent",
  write: (column) => orNothing(column.spent, (share) => bound(column, "≥") + percent(share)),
  speak: (column) => orNothing(column.spent, (share) => bound(column, "at least ") + percent(share)),
};
/** The unit stands once, in the head of the row: nine columns may be narrow. */
const spentPart: Line = { ...spent, words: "Spent, %", write: (column) => spent.write(column).replace(/\u00a0%$/, "") };

/** The whole has no level of its own kind: it is counted below. */
const bandLevel: Line = {
  ...level,
  write: (column) => (column.index === null ? "" : level.write(column)),
  speak: (column) => (column.index === null ? "" : level.speak(column)),
};

/** What each band counts for in a weighted limit. */
function countedIn(unit: string): Line {
  return { words: `In ${unit}`, write: ({ counted }) => wholeDecibels(counted), speak: ({ counted }) => spokenFigure(counted) };
}

/** A weighted limit has one more line: each band as the limit counts it. */
function linesOf(counting: string | null): Line[] {
  if (counting === null) return [level, limit, roomLeft, spentPart];
  return [bandLevel, countedIn(counting), { ...limit, words: `Limit, ${counting}` }, roomLeft, spentPart];
}

function Figure({ line, column }: { line: Line; column: Column }) {
  const text = line.write(column);
  const spoken = line.speak(column);
  if (text === "") return <VisuallyHidden>none</VisuallyHidden>;
  return spoken === text ? (
    text
  ) : (
    <>
      <span aria-hidden="true">{text}</span>
      <VisuallyHidden>{spoken}</VisuallyHidden>
    </>
  );
}

const weight = (column: Column, lit: Column) => (column === lit ? "bg-lampwash font-[650]" : undefined);

/** Bands as columns, each under its own band of the charts above. */
export function FiguresAcross({ columns, lit, counting }: Omit<Props, "onBand">) {
  const lines = linesOf(counting);
  return (
    <table className="w-full table-fixed border-collapse text-center text-table" aria-label="Levels and limits, band by band">
      <thead>
        <tr>
          <th scope="col" className="w-[84px] p-0 leading-none"><VisuallyHidden>Figure</VisuallyHidden></th>
          {columns.map((column) => (
            <th scope="col" key={column.label} className={clsx("p-0 leading-none", column.index === null && "w-[76px]")}>
              <VisuallyHidden>{`${column.label}${column.index === null ? "" : " Hz"}`}</VisuallyHidden>
            </th>
          ))}
          <td className="w-[52px] p-0" rowSpan={lines.length + 1} />
        </tr>
      </thead>
      <tbody>
        {lines.map((line) => (
          <tr key={line.words}>
            <th scope="row" className="border-t border-rule py-1.5 pr-3 text-right text-least font-semibold text-ink2">
              {line.words}
            </th>
            {columns.map((column) => (
              <td key={column.label} className={clsx("whitespace-nowrap border-t border-rule py-1.5", weight(column, lit), line.judged && stateColour[column.state])}>
                <Figure line={line} column={column} />
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function DownRow({ column, lit, counting, onBand }: Omit<Props, "columns"> & { column: Column }) {
  const shown = counting === null ? [level, limit, roomLeft, spent] : [bandLevel, countedIn(counting), roomLeft, spent];
  const spoken = shown.map((line) => <Figure key={line.words} line={line} column={column} />);
  const cell = "border-t border-rule py-2 text-right";
  return (
    <tr className={clsx("cursor-pointer", column === lit && "bg-lampwash shadow-[inset_6px_0_0_var(--lamp)]")} onClick={() => onBand(column)}>
      <th scope="row" className="border-t border-rule py-2 pl-4 text-left font-[650]">
        {column.label}
      </th>
      <td className={cell}>{spoken[0]}</td>
      <td className={cell}>{spoken[1]}</td>
      <td className={cell}>{spoken[3]}</td>
      <td className={clsx(cell, "pr-4 font-[620]", stateColour[column.state])}>
        {column.limit !== null && (
          <span className="inline-flex items-center justify-end gap-2">
            <StatusMark state={column.state} />
            <VisuallyHidden>{column.state}</VisuallyHidden>
            <span>{spoken[2]}</span>
          </span>
        )}
      </td>
    </tr>
  );
}

/** Bands as rows, on the phone. */
export function FiguresDown({ columns, lit, counting, onBand }: Props) {
  const head = "pb-1.5 text-least font-semibold text-ink2";
  return (
    <table className="w-full border-collapse text-table" aria-label="Levels and limits, band by band">
      <thead>
        <tr>
          <th scope="col" className={clsx(head, "pl-4 text-left")}>Hz</th>
          <th scope="col" className={clsx(head, "text-right")}>Level</th>
          <th scope="col" className={clsx(head, "text-right")}>{counting === null ? "Limit" : `In ${counting}`}</th>
          <th scope="col" className={clsx(head, "text-right")}>Spent</th>
          <th scope="col" className={clsx(head, "pr-4 text-right")}>Room left</th>
        </tr>
      </thead>
      <tbody>
        {columns.map((column) => (
          <DownRow key={column.label} column={column} lit={lit} counting={counting} onBand={onBand} />
        ))}
      </tbody>
    </table>
  );
}
