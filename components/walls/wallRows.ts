import type { ConstructionSheet, SheetLayer } from "../../lib/noise/sheet";
import type { Out } from "../../lib/noise/verdict";
import type { Answer } from "../state/plan";
import { leadOf, shareOfElement } from "./answer";
import { wordsOf } from "./elementWords";

export interface WallRow {
  id: string;
  href: string;
  name: string;
  construction: string;
  layers: SheetLayer[];
  /** m², kg/m², m. */
  area: number;
  surfaceMass: number | null;
  thickness: number | null;
  /** dB at the lit band, of the element whole. */
  stops: Out;
  /** Of what the worst listener gets at the lit band; undefined where nothing leaves by it. */
  share: number | undefined;
}

/** One boundary of a room with everything that stands in it. */
export interface WallFace {
  id: string;
  name: string;
  rows: WallRow[];
}

/** The elements of a plan face by face, in the order of its paths; a face without elements is left out unless it is asked for. */
export function wallFaces(
  answer: Answer,
  sheets: readonly ConstructionSheet[],
  hrefOf: (elementId: string) => string,
  withEmpty = false,
): WallFace[] {
  const { plan, verdict } = answer;
  const lead = leadOf(answer);
  const litBand = lead?.bandIndex ?? 1;
  const rowOf = (element: Answer["plan"]["elements"][number]): WallRow => {
    const sheet = sheets.find(({ key }) => key === element.constructionId);
    return {
      id: element.id,
      href: hrefOf(element.id),
      name: element.name,
      construction:
        sheet?.name ??
        (element.kind === "leak" || element.kind === "duct" ? wordsOf(element).one : "nothing chosen yet"),
      layers: sheet?.layers ?? [],
      area: element.area,
      surfaceMass: sheet?.surfaceMass ?? null,
      thickness: sheet?.thickness ?? null,
      stops: verdict.elements[element.id]?.loss[litBand] ?? "unknown",
      share: lead && shareOfElement(lead, element.id),
    };
  };
  return plan.paths.flatMap((path) => {
    const rows = plan.elements.filter(({ pathId }) => pathId === path.id).map(rowOf);
    return rows.length === 0 && !withEmpty ? [] : [{ id: path.id, name: path.name, rows }];
  });
}
