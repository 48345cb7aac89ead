import { basisWords, formatNumber, type BasisWord } from "../format";

const PIXELS_PER_DECIBEL = 4;
const HEIGHT = 14;
/** Half a bar, in pixels, that still shows beside its bead. */
const LEAST = 6;

const beads: Record<BasisWord, (x: number) => React.ReactNode> = {
  measured: (x) => <circle cx={x} cy="7" r="3.2" fill="currentColor" />,
  laboratory: (x) => <rect x={x - 3} y="4" width="6" height="6" fill="currentColor" />,
  calculated: (x) => <path d={`M${x} 3.2l3.8 6.6H${x - 3.8}z`} fill="currentColor" />,
  estimated: (x) => <circle cx={x} cy="7" r="3.2" className="fill-sheet" />,
  unknown: (x) => <circle cx={x} cy="7" r="3.2" className="fill-sheet" strokeDasharray="2 1.8" />,
};

interface Props {
  basis: BasisWord;
  /** One standard deviation, dB: the bar is as wide as the doubt to both sides. */
  doubt?: number;
  /** Instead of the basis' own word: "your figure". */
  word?: string;
}

/** What a figure rests on: a bead on a bar as wide as the doubt, always with its word. */
export function BasisMark({ basis, doubt, word = basisWords[basis] }: Props) {
  const half = doubt === undefined ? 14 : Math.max(LEAST, Math.min(12, doubt) * PIXELS_PER_DECIBEL);
  const middle = half + 1;
  const width = 2 * middle;
  return (
    <span className="inline-flex items-center gap-2 text-second text-ink2">
      <svg
        width={width}
        height={HEIGHT}
        viewBox={`0 0 ${width} ${HEIGHT}`}
        fill="none"
        stroke="currentColor"
        strokeWidth="1.5"
        aria-hidden="true"
        className="block flex-none text-ink"
      >
        <path
          d={`M${middle - half} 7H${middle + half}M${middle - half} 4v6M${middle + half} 4v6`}
          strokeDasharray={basis === "unknown" ? "3 2.5" : undefined}
        />
        {beads[basis](middle)}
      </svg>
      <span>
        {word}
        {doubt !== undefined && `, give or take ${formatNumber(doubt, doubt < 2 ? 1 : 0)}\u00a0dB`}
      </span>
    </span>
  );
}
