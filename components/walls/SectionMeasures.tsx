import { formatQuantity, withUnit } from "../format";
import { BALLOON, type Strip } from "./sectionGeometry";
import { toMillimetres } from "./units";

interface BalloonsProps {
  strips: readonly Strip[];
  centres: readonly number[];
  y: number;
  /** Where the leader ends, inside the layer. */
  foot: number;
  lit?: number;
}

/** Numbers over the layers, each with a leader; decoration, the table carries the words. */
export function Balloons({ strips, centres, y, foot, lit }: BalloonsProps) {
  return strips.map(({ number, x, width }, index) => (
    <g key={number}>
      <path
        d={`M${centres[index]} ${y + BALLOON}L${x + width / 2} ${foot}`}
        strokeWidth="1.2"
        className="stroke-ink"
        fill="none"
      />
      <circle
        cx={centres[index]}
        cy={y}
        r={BALLOON}
        strokeWidth="1.5"
        className={number === lit ? "fill-lamp stroke-onlamp" : "fill-sheet stroke-ink"}
      />
      <text
        x={centres[index]}
        y={y + 4.5}
        textAnchor="middle"
        fontSize="13"
        fontWeight="650"
        className={number === lit ? "fill-onlamp!" : undefined}
      >
        {number}
      </text>
    </g>
  ));
}

const tick = (x: number, y: number) => `M${x - 4} ${y + 4}l8 -8M${x} ${y - 6}v12`;

/** Rough width of a figure in chart text, px: enough to tell whether it fits its layer. */
const textWidth = (text: string) => text.length * 7.4 + 4;

/** One dimension per layer; a figure that does not fit stays in the table alone. */
export function DimensionChain({ strips, y, lit }: { strips: readonly Strip[]; y: number; lit?: number }) {
  const measured = strips.filter(({ width }) => width > 0);
  const first = measured[0];
  const last = measured.at(-1);
  if (!first || !last) return null;
  const ends = [first.x, ...measured.map(({ x, width }) => x + width)];
  return (
    <g>
      <path
        d={`M${first.x} ${y}H${last.x + last.width}${ends.map((x) => tick(x, y)).join("")}`}
        strokeWidth="1.3"
        className="stroke-ink"
        fill="none"
      />
      {measured.map(({ layer, number, x, width }) => {
        const text = formatQuantity(toMillimetres(layer.thickness ?? 0), 1);
        if (textWidth(text) > width) return null;
        return (
          <text
            key={number}
            x={x + width / 2}
            y={y - 9}
            textAnchor="middle"
            fontSize="14"
            fontWeight={number === lit ? 650 : 400}
          >
            {text}
          </text>
        );
      })}
    </g>
  );
}

export function WholeDimension({
  from,
  to,
  y,
  thickness,
}: {
  from: number;
  to: number;
  y: number;
  thickness: number;
}) {
  const text = withUnit(formatQuantity(toMillimetres(thickness), 1), "mm");
  const middle = (from + to) / 2;
  const room = text.length * 10 + 18;
  const beside = room > to - from - 20;
  return (
    <g>
      <path
        d={
          beside
            ? `M${from} ${y}H${to}${tick(from, y)}${tick(to, y)}`
            : `M${from} ${y}H${middle - room / 2}M${middle + room / 2} ${y}H${to}${tick(from, y)}${tick(to, y)}`
        }
        strokeWidth="1.3"
        className="stroke-ink"
        fill="none"
      />
      <text
        x={beside ? to + 12 : middle}
        y={y + 5.5}
        textAnchor={beside ? "start" : "middle"}
        fontSize="17"
        fontWeight="640"
        className="figure"
      >
        {text}
      </text>
    </g>
  );
}

/** A rule to measure by, where the drawing stands alone. */
export function ScaleBar({ x, y, scale, length }: { x: number; y: number; scale: number; length: number }) {
  const end = x + length * scale;
  return (
    <g>
      <path
        d={`M${x} ${y}H${end}M${x} ${y - 4}v8M${end} ${y - 4}v8`}
        strokeWidth="1.5"
        className="stroke-ink2"
        fill="none"
      />
      <text x={end + 8} y={y + 4} fontSize="13" className="fill-ink2!">
        {withUnit(formatQuantity(toMillimetres(length)), "mm")}
      </text>
    </g>
  );
}
