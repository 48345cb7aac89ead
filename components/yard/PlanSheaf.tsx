import { hatchFill } from "../marks/HatchDefs";
import { drawLine } from "./planScale";
import { edgeOf, type Ribbon } from "./sheaf";

interface Props {
  ribbons: readonly Ribbon[];
  litId: string | null;
  onLight: (ribbon: Ribbon) => void;
}

/** Each way into the lit listener as a ribbon as wide as its share; the lit one on top. */
export function PlanSheaf({ ribbons, litId, onLight }: Props) {
  const order = ribbons.toSorted((one, two) => Number(one.way.id === litId) - Number(two.way.id === litId));
  return (
    <g aria-hidden="true">
      {order.map((ribbon) => {
        const { way, middle, width, thin } = ribbon;
        const lit = way.id === litId;
        return (
          <g key={way.id} onClick={() => onLight(ribbon)} className="cursor-pointer">
            {thin ? (
              <path d={drawLine(middle)} fill="none" strokeWidth={lit ? 3 : 1.5} className="stroke-ink" />
            ) : (
              <path d={`${drawLine(edgeOf(middle, width))}Z`} fill={hatchFill(way.kind, lit)} strokeWidth={lit ? 1.6 : 1} className="stroke-ink" />
            )}
          </g>
        );
      })}
    </g>
  );
}
