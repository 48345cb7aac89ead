import type { ConstructionSheet } from "../../lib/noise/sheet";
import { formatNumber, withUnit } from "../format";
import type { PathElement } from "./elementWords";

export interface Caution {
  heading: string;
  words: string;
}

interface Subject {
  element: PathElement;
  sheet?: ConstructionSheet;
  /** kg of boards; null where the layers do not say. */
  weight: number | null;
  /** kg of boards that stood here when the page was opened. */
  weightBefore: number | null;
}

const carried = new Set<PathElement["kind"]>(["wall", "roof", "floor", "ceiling"]);

/** What the builder must know of this element besides its decibels. None of it holds a figure without a source. */
export function cautionsOf(subject: Subject): Caution[] {
  return [
    ...gapCautions(subject),
    ...leafCautions(subject.sheet),
    ...weightCautions(subject),
    ...kindCautions(subject),
  ];
}

/** What the channel hangs on, by what is built. */
const timberOf = ({ kind }: PathElement): string => {
  if (kind === "roof") return "rafter";
  return kind === "floor" || kind === "ceiling" ? "joist" : "stud";
};

function gapCautions({ element, sheet }: Subject): Caution[] {
  const number = (sheet?.layers.findIndex(({ look, fill }) => look === "gap" && fill === 0) ?? -1) + 1;
  if (!sheet || number === 0 || sheet.leaves < 2) return [];
  const joint = sheet.joints[0];
  if (joint === "resilient_channel" || joint === "clips") {
    return [
      {
        heading: `Nothing through layer ${number}`,
        words: `A screw that passes the channel and reaches the ${timberOf(element)} ties the two leaves together, and the channel might as well not be there.`,
      },
    ];
  }
  if (joint !== "double_stud") return [];
  return [
    {
      heading: `Keep layer ${number} empty`,
      words:
        "One offcut or stray screw across the gap ties the two leaves together. Look all the way up before the wall is closed.",
    },
  ];
}

function leafCautions(sheet?: ConstructionSheet): Caution[] {
  if (!sheet || sheet.leaves < 3) return [];
  return [
    {
      heading: "Three leaves",
      words:
        "A sheet of boards between two others makes a second hollow. It can let more bass through than the same boards put on the outer two.",
    },
  ];
}

/** Stone all through: no boards, no frame, no wool. */
export const isMasonry = (sheet?: ConstructionSheet) =>
  sheet !== undefined && sheet.layers.length > 0 && sheet.layers.every(({ look }) => look === "masonry");

function weightCautions({ element, sheet, weight, weightBefore }: Subject): Caution[] {
  if (weight === null || !carried.has(element.kind)) return [];
  const more = weightBefore === null ? 0 : weight - weightBefore;
  const change =
    Math.round(more) === 0
      ? ""
      : `, ${withUnit(formatNumber(Math.abs(more)), "kg")} ${more > 0 ? "more" : "less"} than before`;
  const kilograms = `${withUnit(formatNumber(weight), "kg")}${change}`;
  const whole = isMasonry(sheet)
    ? `This ${element.kind} weighs ${kilograms}.`
    : `The boards of this ${element.kind} weigh ${kilograms}; frame and wool come on top.`;
  return [
    {
      heading: "Ask a structural engineer",
      words: `${whole} Whoever answers for the building must say that it carries that, and the stack on site too.`,
    },
  ];
}

function kindCautions({ element: { kind }, weight }: Subject): Caution[] {
  if (kind === "door") {
    const hung =
      weight === null
        ? []
        : [
            {
              heading: `The leaf weighs ${withUnit(formatNumber(weight), "kg")}`,
              words:
                "Hinges, frame and the studs that carry them have to be rated for it. Ask whoever hangs it.",
            },
          ];
    return [
      ...hung,
      {
        heading: "Keep the way out",
        words:
          "A heavy door has to open from inside, by hand and without a key, however it is sealed. Do not make it the only way out.",
      },
    ];
  }
  if (kind === "roof") {
    return [
      {
        heading: "Let the roof dry",
        words:
          "Sealing the vents of a roof can rot it. Where air is to be stopped, ask what your climate needs against moisture first.",
      },
    ];
  }
  return [];
}
