import type { Plan, Space } from "@/lib/noise/plan";
import { capitalise, countWords, listWords } from "../format";
import type { Caution } from "../walls/cautions";

/** What must be settled before a room is made tight; who decides is said with each. */
export function sealCautions(plan: Plan, room: Space): Caution[] {
  return [
    {
      heading: "A tight room needs its own air",
      words:
        "A seal that stops sound stops draughts too. Bring fresh air in by a fan with a run of its own and let it work whenever somebody is inside; a split unit only turns the same air round. How much is a matter for local rules and for whoever designs the ventilation.",
    },
    {
      heading: "Nothing that burns",
      words:
        "No stove, heater or boiler that burns fuel in this room or draws its air from it. Smoke and carbon monoxide alarms as local rules ask. Leave gas and flues to a licensed installer.",
    },
    { heading: "The way out", words: `${wayOut(plan, room)} It must open from inside without a key. What counts as a way out, from here and from any loft, the building office says.` },
    {
      heading: "Weight",
      words: "Layers that stop sound are heavy. Ask a structural engineer before anything is hung from rafters or joists, or stacked on one spot.",
    },
    {
      heading: "Wires and pipes",
      words: "Each goes through what you have just sealed. Electrics, refrigerant and gas belong to licensed trades, with a permit where local rules ask for one.",
    },
  ];
}

/** The doors of this room, as they stand in the plan. */
function wayOut(plan: Plan, { id }: Space): string {
  const paths = plan.paths.filter(({ fromSpaceId, toSpaceId }) => fromSpaceId === id || toSpaceId === id);
  const doors = plan.elements.flatMap(({ kind, name, pathId }) => {
    const path = paths.find((one) => one.id === pathId);
    return kind === "door" && path ? [{ name, outdoors: path.toSpaceId === null }] : [];
  });
  if (doors.length === 0) return "No door of this room is drawn.";
  const outdoors = doors.filter((door) => door.outdoors);
  if (outdoors.length === 0) return `${capitalise(countWords(doors.length, "door"))}, and none of them to outdoors: whoever leaves passes another room.`;
  const names = listWords(outdoors.map(({ name }) => name));
  return outdoors.length === 1 ? `One door leads straight outdoors: ${names}.` : `${capitalise(countWords(outdoors.length, "door"))} lead straight outdoors: ${names}.`;
}
