"use client";

import clsx from "clsx";
import type { PathVerdict } from "@/lib/noise/verdict";
import { percent, spokenFigure, wholeDecibels, withUnit } from "../format";
import { HatchSwatch } from "../marks/HatchSwatch";
import { aloneOf, byShare, isNumber, shareOf, type Column } from "./columns";
import { useRoving } from "./useRoving";

/** Rows at most, and the least share that earns a row of its own. */
const ROWS = 7;
const LEAST = 0.005;

interface Props {
  paths: readonly PathVerdict[];
  column: Column;
  litId: string | null;
  trial: boolean;
  onLight: (pathId: string) => void;
  onTrial: () => void;
  onOpen: (path: PathVerdict) => void;
}

/** What the server sends of the quietest paths: one sum under this name. */
const GATHERED = "rest";

/** The loudest paths, and the lit one wherever it stands. */
export function shownPaths(paths: readonly PathVerdict[], column: Column, litId: string | null): PathVerdict[] {
  const sorted = byShare(paths, column).filter(({ id }) => id !== GATHERED);
  return sorted.filter((path, index) => path.id === litId || (index < ROWS && (shareOf(path, column) >= LEAST || index < 3)));
}

function aloneWords(path: PathVerdict, column: Column): string {
  const level = aloneOf(path, column);
  return isNumber(level) ? withUnit(wholeDecibels(level), column.unit) : wholeDecibels(level);
}

function spokenRow(path: PathVerdict, column: Column, silenced: boolean): string {
  const alone = `${spokenFigure(aloneOf(path, column))} ${column.unit} alone`;
  return [path.name, alone, percent(shareOf(path, column)), silenced ? "silenced on trial" : ""].filter(Boolean).join(", ");
}

const grid = "grid grid-cols-[24px_1fr_72px_56px] items-center gap-x-2.5 px-4 mid:px-6.5";

/** By what the sound leaves, loudest first. Space silences the lit path on trial, Enter opens its page. */
export function PathList({ paths, column, litId, trial, onLight, onTrial, onOpen }: Props) {
  const shown = shownPaths(paths, column, litId);
  const lit = shown.findIndex(({ id }) => id === litId);
  const { list, onKeyDown } = useRoving({
    items: shown,
    lit,
    onLight: ({ id }) => onLight(id),
    onEnter: onOpen,
    onSpace: onTrial,
  });
  const rest = Math.max(0, 1 - shown.reduce((sum, path) => sum + shareOf(path, column), 0));
  return (
    <div className="text-table">
      <div aria-hidden="true" className={clsx(grid, "pb-1.5 text-least font-semibold text-ink2")}>
        <span className="col-start-3 text-right">alone</span>
        <span className="text-right">share</span>
      </div>
      <ul ref={list} role="listbox" aria-label={`Paths ${column.where}, loudest first`} onKeyDown={onKeyDown}>
        {shown.map((path, index) => (
          <li
            key={path.id}
            role="option"
            aria-selected={index === lit}
            aria-label={spokenRow(path, column, trial && index === lit)}
            tabIndex={index === Math.max(0, lit) ? 0 : -1}
            onClick={() => onLight(path.id)}
            className={clsx(grid, "min-h-11 cursor-pointer border-t border-rule -outline-offset-2 focus-visible:outline-2 focus-visible:outline-ink", index === lit ? "bg-lampwash shadow-[inset_6px_0_0_var(--lamp)]" : "hover:bg-well")}
          >
            <HatchSwatch kind={path.kind} lit={index === lit} />
            <span className="py-2 font-semibold leading-snug">{path.name}</span>
            <span className="whitespace-nowrap text-right">{aloneWords(path, column)}</span>
            <span className="whitespace-nowrap text-right text-ink2">{percent(shareOf(path, column))}</span>
          </li>
        ))}
      </ul>
      {paths.length > shown.length && (
        <p className={clsx(grid, "min-h-11 border-t border-rule text-ink2")}>
          <span className="col-span-2 col-start-1">The rest together</span>
          <span className="col-start-4 text-right">{percent(rest)}</span>
        </p>
      )}
    </div>
  );
}
