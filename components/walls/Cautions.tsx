import { Icon } from "../marks/Icon";
import type { Caution } from "./cautions";

export function Cautions({ cautions }: { cautions: readonly Caution[] }) {
  if (cautions.length === 0) return null;
  return (
    <ul className="grid gap-3">
      {cautions.map(({ heading, words }) => (
        <li key={heading} className="flex gap-3 rounded-control border border-ink p-4">
          <Icon name="hand" />
          <div className="min-w-0">
            <h3 className="text-part">{heading}</h3>
            <p className="mt-1 text-second text-ink2">{words}</p>
          </div>
        </li>
      ))}
    </ul>
  );
}
