import clsx from "clsx";
import { Icon } from "../marks/Icon";
import { Button } from "../ui/Button";
import { isSame, keyOf, type Thing, type ThingGroup } from "./things";

interface Props {
  groups: readonly ThingGroup[];
  lit: Thing | null;
  mayAdd: boolean;
  onLight: (thing: Thing) => void;
  onAdd: (part: ThingGroup["part"]) => void;
}

/** Everything in the yard, group by group; what is pressed is lit on the plan and opens its fields. */
export function ThingList({ groups, lit, mayAdd, onLight, onAdd }: Props) {
  return (
    <div className="grid items-start gap-x-8 mid:grid-cols-2 wide:grid-cols-3">
      {groups.map(({ part, heading, add, things }) => (
        <section key={part} aria-label={heading} className="mb-4 min-w-0">
          <div className="flex min-h-10 items-center justify-between gap-3 border-b-2 border-ink pb-1">
            <h3 className="text-part">{heading}</h3>
            {mayAdd && add && (
              <Button icon={<Icon name="plus" size={18} />} className="!min-h-8 !px-2.5 !text-second" onClick={() => onAdd(part)}>
                {add}
              </Button>
            )}
          </div>
          <ul>
            {things.map((thing) => (
              <li key={keyOf(thing)} className="border-t border-rule first:border-t-0">
                <button
                  type="button"
                  aria-pressed={isSame(lit, thing)}
                  onClick={() => onLight({ part: thing.part, id: thing.id })}
                  className={clsx("flex min-h-10 w-full flex-wrap items-baseline justify-between gap-x-3 px-2 py-2 text-left", isSame(lit, thing) ? "bg-lampwash shadow-[inset_6px_0_0_var(--lamp)] pl-3.5" : "hover:bg-well")}
                >
                  <span className="min-w-0 break-words font-semibold">{thing.name}</span>
                  <span className="text-second text-ink2">{thing.says}</span>
                </button>
              </li>
            ))}
            {things.length === 0 && <li className="px-2 py-2 text-second text-ink2">None yet.</li>}
          </ul>
        </section>
      ))}
    </div>
  );
}
