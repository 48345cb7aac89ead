import type { Plan } from "../../lib/noise/plan";
import type { Provenance } from "../../lib/noise/spectrum";
import type { ConstructionSheet } from "../../lib/noise/sheet";
import { Sheet } from "../ui/Sheet";
import { isMasonry } from "./cautions";
import { directionOf, wordsOf, type PathElement } from "./elementWords";
import { LayerTable } from "./LayerTable";

interface Props {
  element: PathElement;
  plan: Plan;
  sheet?: ConstructionSheet;
  lit?: number;
  onLight: (number: number | undefined) => void;
}

/** What the element is made of, layer by layer, or why there is nothing to list. */
export function LayersSheet({ element, plan, sheet, lit, onLight }: Props) {
  if (!sheet) {
    return (
      <Sheet heading="No layers">
        <p className="text-ink2">{reasonFor(element)}</p>
      </Sheet>
    );
  }
  return (
    <Sheet heading={`Layers, ${directionOf(element, plan)}`}>
      {sheet.layers.length > 0 ? (
        <LayerTable
          sheet={sheet}
          whole={`Whole ${wordsOf(element).one}`}
          counted={countedIn(element, sheet)}
          lit={lit}
          onLight={onLight}
        />
      ) : (
        <p className="text-ink2">
          Its layers are not described; the figures were measured on the whole thing.
        </p>
      )}
      <p className="mt-3 text-second text-ink2">
        {sheet.name}. {sourceWords(sheet.provenance)}
      </p>
    </Sheet>
  );
}

function countedIn({ kind }: PathElement, sheet: ConstructionSheet): string {
  if (kind === "window") return "panes alone";
  if (kind === "door" && sheet.layers.length === 1) return "leaf alone";
  return isMasonry(sheet) ? "all of it" : "boards alone";
}

function reasonFor({ kind }: PathElement): string {
  if (kind === "leak") return "A hole stops nothing: all of its open area lets sound through.";
  if (kind === "duct") return "What a duct stops follows from the pieces of its run.";
  return "Nothing has been chosen for it yet.";
}

function sourceWords({ document, clause, memory }: Provenance): string {
  const said = clause ? `${document}, ${clause}` : document;
  const marked =
    memory && !/from memory/i.test(said)
      ? `From memory: ${said}`
      : said.charAt(0).toUpperCase() + said.slice(1);
  return marked.endsWith(".") ? marked : `${marked}.`;
}
