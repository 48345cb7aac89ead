import type { State } from "@/components/format";
import type { ProjectLine } from "@/components/projects/ProjectLine";
import type { IconName } from "@/components/marks/Icon";

/** Invented figures that put each part into each of its states. */
export const margins: { state: State; margin?: number; doubt?: number; says: string }[] = [
  { state: "under", margin: 6.2, doubt: 3, says: "Bead hangs below, hollow. More to spare than the doubt." },
  { state: "tight", margin: 1.4, doubt: 3, says: "Bead sits on the line, half full. Under, but within the doubt." },
  { state: "tight", margin: 0.3, doubt: 3, says: "Less than a whole decibel." },
  { state: "over", margin: -2.8, doubt: 3, says: "Wedge stands on the line, solid. Above the limit." },
  { state: "over", margin: -21, doubt: 4, says: "Beyond the end of the beam." },
  { state: "not weighed", says: "Bead is dashed. No result, or one we will not stand behind." },
];

export const iconNames: IconName[] = [
  "weigh", "print", "moon", "plus", "lock", "camera", "tick", "hand", "note", "brokenBeam", "noSignal",
  "arrow", "back", "up", "down", "fold", "clock", "undo", "remove", "find", "more",
];

const lot = [[0, 0], [24, 0], [24, 18], [0, 18]] as const;
const square = (x: number, y: number, width: number, depth: number) =>
  [[x, y], [x + width, y], [x + width, y + depth], [x, y + depth]] as const;

const plain = { yardHref: "/specimens/yard", revision: 1, changedAt: "2027-01-14T20:04:00Z", archived: false, may: { rename: true, copy: true } } as const;

export const projects: ProjectLine[] = [
  {
    ...plain, id: "a", href: "/specimens", name: "Lot 7, an invented row", says: "Drums in a shed at the back fence", lot,
    buildings: [
      { outline: square(1, 11, 4.4, 5), kind: "studio" },
      { outline: square(16, 5, 7, 9), kind: "house" },
      { outline: square(1.6, 1.6, 6, 6), kind: "house" },
    ],
    listener: [16, 10.8], listenerName: "No. 9, bedroom", state: "over", margin: -2.8, doubt: 3.1, band: 63,
    stage: "As drawn", weighedAt: "2027-01-14T20:04:00Z", people: [{ name: "Ines", says: "yours" }, { name: "Tobi", says: "acoustician" }],
  },
  {
    ...plain, id: "b", href: "/specimens", name: "The pump house", says: "Cello and voice, thick stone", lot: square(0, 0, 15, 18),
    buildings: [{ outline: square(4.6, 12, 3.6, 3.6), kind: "studio" }, { outline: square(9.8, 2, 5, 6.6), kind: "house" }],
    listener: [9.8, 6.4], listenerName: "the upstairs flat", state: "under", margin: 8.4, doubt: 3, band: 125,
    stage: "Built and measured", weighedAt: "2026-05-12T09:00:00Z", people: [{ name: "Ines", says: "yours" }],
  },
  {
    ...plain, id: "c", href: "/specimens", name: "Corner lot with a name that goes on for longer than any list was made for", says: "Two guitar amps over a garage", lot: square(0, 0, 19.5, 16),
    buildings: [{ outline: square(1.6, 8, 5, 5), kind: "studio" }, { outline: square(12.8, 7, 6, 6.6), kind: "house" }],
    listener: [12.8, 11], listenerName: "No. 2", state: "not weighed", was: "tight", margin: 2.1, doubt: 3, stale: "door seal, 2 limits",
    stage: "As drawn", weighedAt: "2026-12-24T18:00:00Z", people: [{ name: "Anouk" }, { name: "Maro", says: "builder" }],
  },
  {
    ...plain, id: "d", href: "/specimens", name: "A cottage", says: "Nothing weighed yet", lot: square(0, 0, 16.4, 13.4),
    buildings: [{ outline: square(1.6, 9, 3.6, 2.8), kind: "studio" }],
    state: "not weighed", stage: "Yard drawn", people: [{ name: "Ines", says: "yours" }],
  },
];
