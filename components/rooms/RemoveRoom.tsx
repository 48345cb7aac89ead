"use client";

import Link from "next/link";
import type { Plan, Space } from "@/lib/noise/plan";
import { limitsAddress, sourcesAddress, wallsAddress } from "../addresses";
import { countWords, listWords } from "../format";
import { Button } from "../ui/Button";
import { Dialog } from "../ui/Dialog";
import { isHeld, tiesOf, type RoomTies } from "./holders";

interface Props {
  plan: Plan;
  room: Space;
  projectId: string;
  open: boolean;
  error?: string;
  onRemove: () => void;
  onClose: () => void;
}

/** Says what goes with a room, or what holds it. */
export function RemoveRoom({ plan, room, projectId, open, error, onRemove, onClose }: Props) {
  const ties = tiesOf(plan, room);
  const held = isHeld(ties);
  return (
    <Dialog
      open={open}
      heading={held ? "This room is in use" : "Remove this room?"}
      onClose={onClose}
      actions={
        <>
          {!held && (
            <Button look="ink" onClick={onRemove}>
              Remove it
            </Button>
          )}
          <Button onClick={onClose}>{held ? "Close" : "Keep it"}</Button>
        </>
      }
    >
      <p className="[overflow-wrap:anywhere]">{held ? holdWords(room.name) : goWords(room.name, ties)}</p>
      {held && <Holders ties={ties} projectId={projectId} />}
      {error && <p className="mt-2 font-semibold text-over">{error}</p>}
    </Dialog>
  );
}

const holdWords = (name: string) => `${name} cannot go while something in it counts. Move or remove these first:`;

function goWords(name: string, { surfaces, paths, elements }: RoomTies): string {
  const going = [
    surfaces.length > 0 && countWords(surfaces.length, "surface"),
    paths.length > 0 && countWords(paths.length, "boundary", "boundaries"),
    elements.length > 0 && `${countWords(elements.length, "wall or opening", "walls and openings")} (${shortList(elements)})`,
  ].filter((words) => words !== false);
  return going.length === 0 ? `Nothing else hangs on ${name}.` : `With ${name} go ${listWords(going)}. What the constructions are made of stays in the yard.`;
}

const SHOWN = 4;
const shortList = (names: readonly string[]) =>
  names.length > SHOWN ? `${names.slice(0, SHOWN - 1).join(", ")} and ${names.length - SHOWN + 1} more` : listWords(names);

function Holders({ ties: { sources, listeners, mouths }, projectId }: { ties: RoomTies; projectId: string }) {
  const groups = [
    { what: "Sources", names: sources, href: sourcesAddress(projectId) },
    { what: "Listeners", names: listeners, href: limitsAddress(projectId) },
    { what: "Mouths of ducts", names: mouths, href: wallsAddress(projectId) },
  ].filter(({ names }) => names.length > 0);
  return (
    <ul className="mt-2 grid gap-1">
      {groups.map(({ what, names, href }) => (
        <li key={what} className="[overflow-wrap:anywhere]">
          <Link href={href} className="inline-block min-h-6 font-semibold text-ink">
            {what}
          </Link>
          : {shortList(names)}
        </li>
      ))}
    </ul>
  );
}
