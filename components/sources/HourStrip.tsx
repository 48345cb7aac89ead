import { DAY, spansOf, type Hours } from "./hours";

interface Props {
  /** Hours it is at work; null where nobody has said. */
  hours: Hours | null;
  /** Hours that limits speak of: the grey ground. */
  limits: readonly Hours[];
}

/** One day: solid where the source is at work, outlined from end to end where no hours are said. Words stand beside it. */
export function HourStrip({ hours, limits }: Props) {
  const grounds = limits.flatMap(spansOf);
  return (
    <svg width="100%" height="28" viewBox={`0 0 ${DAY} 28`} preserveAspectRatio="none" aria-hidden="true" className="block">
      {grounds.map(([from, to]) => (
        <g key={`${from} ${to}`}>
          <rect x={from} y="3" width={to - from} height="22" className="fill-rule" fillOpacity="0.6" />
          <path d={`M${from} 0V28M${to} 0V28`} strokeWidth="1" vectorEffect="non-scaling-stroke" className="stroke-ink3" />
        </g>
      ))}
      <path d={`M0 14H${DAY}`} strokeWidth="1" vectorEffect="non-scaling-stroke" className="stroke-edge" />
      {hours ? (
        spansOf(hours).map(([from, to]) => <rect key={from} x={from} y="7" width={to - from} height="14" className="fill-ink" />)
      ) : (
        <rect x="1" y="8" width={DAY - 2} height="12" strokeWidth="1.5" strokeDasharray="5 4" vectorEffect="non-scaling-stroke" className="fill-none stroke-ink2" />
      )}
    </svg>
  );
}

/** Hours from midnight to midnight over the strips. */
export function HourAxis() {
  return (
    <div aria-hidden="true">
      <div className="flex justify-between text-chart text-ink2">
        {[0, 6, 12, 18, 24].map((hour) => (
          <span key={hour}>{hour}</span>
        ))}
      </div>
      <svg width="100%" height="7" viewBox="0 0 24 7" preserveAspectRatio="none" className="block">
        <path d={Array.from({ length: 25 }, (_, hour) => `M${hour} 7V${hour % 6 ? 3 : 0}`).join("")} strokeWidth="1" vectorEffect="non-scaling-stroke" className="stroke-ink" />
      </svg>
    </div>
  );
}
