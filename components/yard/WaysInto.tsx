import clsx from "clsx";
import type { ReactNode } from "react";
import { formatNumber, percent, withUnit } from "../format";
import { HatchSwatch } from "../marks/HatchSwatch";
import type { Figures } from "../ui/figures";
import { toShown, unitName } from "../ui/quantities";
import { withMark } from "../ui/figures";
import type { Way } from "./sheaf";

interface Props {
  heading: string;
  ways: readonly Way[];
  litId: string | null;
  figures: Figures;
  onLight: (way: Way) => void;
}

/** Most of a listener's sound comes by few ways; the rest is left to the budget. */
const SHOWN = 7;

/** The ways into the lit listener with their distance and share: the sheaf in figures. */
export function WaysInto({ heading, ways, litId, figures, onLight }: Props) {
  if (ways.length === 0) return null;
  const long = (distance: number | null) =>
    distance === null ? "" : withUnit(withMark(formatNumber(toShown("length", figures.units, distance), 1), figures.mark), unitName("length", figures.units));
  return (
    <section className="mt-6">
      <h3 className="mb-1 text-part">{heading}</h3>
      <ul>
        {ways.slice(0, SHOWN).map((way) => (
          <li key={way.id} className="border-t border-rule first:border-t-0">
            <Line way={way} lit={way.id === litId} onLight={onLight}>
              <HatchSwatch kind={way.kind} lit={way.id === litId} />
              <span className="min-w-0 break-words font-semibold">{way.name}</span>
              <span className="text-ink2">{long(way.distance)}</span>
              <span className="text-right font-semibold">{percent(way.share)}</span>
            </Line>
          </li>
        ))}
      </ul>
      <p className="mt-3 text-second text-ink2">
        The sheaf is as wide as everything that arrives, and a ribbon’s width is its share of the energy: half a ribbon is half of its part, not half of the noise.
      </p>
    </section>
  );
}

const line = "-mx-3 grid w-[calc(100%+24px)] min-h-10 grid-cols-[20px_minmax(0,1fr)_auto_52px] items-center gap-x-3 px-3 py-1.5 text-left text-table";

/** A way by a part of the yard lights that part; one that has no part to light is read. */
function Line({ way, lit, onLight, children }: { way: Way; lit: boolean; onLight: Props["onLight"]; children: ReactNode }) {
  if (way.partId === null) return <div className={line}>{children}</div>;
  return (
    <button type="button" aria-pressed={lit} onClick={() => onLight(way)} className={clsx(line, lit ? "bg-lampwash" : "hover:bg-well")}>
      {children}
    </button>
  );
}
