import clsx from "clsx";
import Link from "next/link";
import type { Thing } from "./inside";

interface Props {
  things: readonly Thing[];
  litThing: string | null;
  onLight: (id: string | null) => void;
}

/** What is in the room and in its walls; the numbers are the balloons of the drawing. */
export function InsideList({ things, litThing, onLight }: Props) {
  if (things.length === 0) {
    return <p className="text-ink2">Nothing yet: no source, no listener, no door and no window. Sources and listeners are put in under their own stages.</p>;
  }
  return (
    <ul className="gap-x-8 mid:columns-2">
      {things.map((thing) => (
        <li
          key={thing.id}
          onMouseEnter={() => onLight(thing.id)}
          onMouseLeave={() => onLight(null)}
          className="flex break-inside-avoid items-start gap-3 border-t border-rule py-2"
        >
          <Number thing={thing} lit={thing.id === litThing} />
          <span className="min-w-0 [overflow-wrap:anywhere]">
            <Link href={thing.href} onFocus={() => onLight(thing.id)} onBlur={() => onLight(null)} className="inline-block min-h-6 font-semibold text-ink">
              {thing.name}
            </Link>{" "}
            <span className="text-second text-ink2">{thing.says}</span>
          </span>
        </li>
      ))}
    </ul>
  );
}

/** Dashed where nothing is drawn: the thing has no place on the lot. */
function Number({ thing: { number }, lit }: { thing: Thing; lit: boolean }) {
  return (
    <span
      aria-hidden="true"
      title={number === null ? "No place of its own in the drawing" : undefined}
      className={clsx(
        "flex size-6 flex-none items-center justify-center rounded-full border-[1.5px] text-least font-bold",
        number === null ? "border-dashed border-edge" : "border-ink",
        lit && number !== null && "bg-lamp text-onlamp",
      )}
    >
      {number}
    </span>
  );
}
