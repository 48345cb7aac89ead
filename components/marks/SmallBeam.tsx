import clsx from "clsx";
import { marginWords, type Figure, type State } from "../format";
import { stateColour } from "./MarginWords";
import { outlineLowerHalf, outlinePoise } from "./poise";

/** The beam reads from 12 dB over (left end) to 12 dB under (right end), one notch to a decibel. */
const RANGE = 12;
const HEIGHT = 38;
const LINE = 17;
/** Half a poise fits beside either end. */
const EDGE = 9;
const ROOM_FOR_CHEVRON = 9;

interface Props {
  state: State;
  margin?: Figure;
  doubt?: number | null;
  /** Drawn in these pixels, never scaled. */
  width?: number;
  /** Figures from an older weighing stay, but pale. */
  stale?: boolean;
}

const clampToBeam = (decibels: number) => Math.max(-RANGE, Math.min(RANGE, decibels));

function drawNotches(place: (decibels: number) => number): string {
  return Array.from({ length: 2 * RANGE + 1 }, (_, index) => index - RANGE)
    .map((decibels) => `M${place(decibels)} ${LINE}v${decibels % 4 === 0 ? -6 : -3.5}`)
    .join("");
}

/** A poise at the margin; a chevron beside it says that the margin lies beyond the end of the beam. */
function Poise({ x, state, beyond }: { x: number; state: State; beyond: number }) {
  return (
    <g className={stateColour[state]} stroke="currentColor" strokeWidth="1.7" strokeLinejoin="round">
      <path d={outlinePoise(x, LINE + 1, 17, 15)} className={state === "over" ? undefined : "fill-sheet"} fill="currentColor" />
      {state === "tight" && <path d={outlineLowerHalf(x, LINE + 1, 17, 15)} fill="currentColor" />}
      {beyond !== 0 && <path d={`M${x + beyond * 13} ${LINE + 5}l${beyond * 4} 4l${-beyond * 4} 4`} fill="none" />}
    </g>
  );
}

/** One listener on the beam: the pivot is the limit, right of it there is room, the pale band is the doubt. */
export function SmallBeam({ state, margin, doubt, width = 228, stale = false }: Props) {
  const inner = width - 2 * EDGE;
  const place = (decibels: number) => Math.round((width / 2 + (clampToBeam(decibels) * inner) / (2 * RANGE)) * 10) / 10;
  const weighed = state !== "not weighed" && typeof margin === "number" && Number.isFinite(margin);
  const beyond = weighed && Math.abs(margin) > RANGE ? Math.sign(margin) : 0;
  return (
    <svg
      width={width}
      height={HEIGHT}
      viewBox={`0 0 ${width} ${HEIGHT}`}
      role="img"
      aria-label={`Beam: ${marginWords(state, margin)}`}
      className={clsx("block max-w-full", stale && "opacity-50")}
      fill="none"
    >
      {weighed && typeof doubt === "number" && (
        <rect
          x={place(margin - doubt)}
          y={LINE - 3.5}
          width={Math.max(2, place(margin + doubt) - place(margin - doubt))}
          height="7"
          fill="currentColor"
          fillOpacity="0.3"
          className={stateColour[state]}
        />
      )}
      <g className={weighed ? "stroke-ink" : "stroke-ink3"}>
        {weighed && <path d={drawNotches(place)} strokeWidth="1" />}
        <path d={`M${place(-RANGE)} ${LINE}H${place(RANGE)}`} strokeWidth="2" strokeDasharray={weighed ? undefined : "5 4"} />
        <path d={`M${width / 2} ${LINE}V8.5`} strokeWidth="1.7" />
        <circle cx={width / 2} cy="5" r="3" strokeWidth="1.7" className="fill-sheet" />
      </g>
      {weighed && <Poise x={place(margin) - beyond * ROOM_FOR_CHEVRON} state={state} beyond={beyond} />}
    </svg>
  );
}
