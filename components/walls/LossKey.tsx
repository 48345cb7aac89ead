import { formatNumber, withUnit } from "../format";

interface Props {
  name: string;
  other?: string;
  massAirMass: number | null;
}

/** What the lines of the drawing below are, where it is too narrow to bear their names. */
export function LossKey({ name, other, massAirMass }: Props) {
  return (
    <ul className="mb-1 flex flex-col gap-1 text-second">
      <Entry line="stroke-ink" width={2.4} name={name} strong />
      {other && <Entry line="stroke-ink2" width={1.6} dashes="5 4" name={other} />}
      {massAirMass !== null && (
        <Entry
          line="stroke-ink"
          width={1.5}
          dashes="2 3"
          name={`the leaves swing together at ${withUnit(formatNumber(massAirMass), "Hz")}`}
        />
      )}
    </ul>
  );
}

interface EntryProps {
  line: string;
  width: number;
  dashes?: string;
  name: string;
  strong?: boolean;
}

function Entry({ line, width, dashes, name, strong }: EntryProps) {
  return (
    <li className="flex items-center gap-2">
      <svg width="26" height="8" aria-hidden="true" className="shrink-0">
        <path d="M0 4H26" strokeWidth={width} strokeDasharray={dashes} className={line} />
      </svg>
      <span className={strong ? "font-semibold" : "text-ink2"}>{name}</span>
    </li>
  );
}
