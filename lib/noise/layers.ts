import type { Construction, Layer } from "./construction";
import { findMaterial } from "./materials";
import { descriptionSchema, type Description } from "./transmission";

type Board = Extract<Layer, { kind: "board" }>;
type Cavity = Extract<Layer, { kind: "cavity" }>;
type Stack = { leaves: Board[][]; cavities: Cavity[] };

/** Layers that count for transmission loss: what lies outside a ventilated gap does not (solver method 6). */
function soundLayers(layers: readonly Layer[]): Layer[] {
  return layers.slice(layers.findLastIndex(({ kind }) => kind === "ventilated gap") + 1);
}

/** Leaves and the cavities between them; a cavity that no leaf closes is left out. Null where two cavities meet. */
function stackOf(layers: readonly Layer[]): Stack | null {
  const stack: Stack = { leaves: [], cavities: [] };
  let open: Cavity | null = null;
  let leaf: Board[] = [];
  for (const layer of soundLayers(layers)) {
    if (layer.kind === "cavity") {
      if (open) return null;
      if (leaf.length > 0) [open, leaf] = [layer, []];
    } else if (layer.kind === "board") {
      if (leaf.length === 0) {
        stack.leaves.push(leaf);
        if (open) stack.cavities.push(open);
        open = null;
      }
      leaf.push(layer);
    }
  }
  return stack;
}

/** The bond of a whole leaf: the one that all its boards share, else the loosest. */
function bondOf([, ...rest]: readonly Board[]): Board["bond"] {
  const [first] = rest;
  return first && rest.every(({ bond }) => bond === first.bond) ? first.bond : "screwed";
}

function leafOf(boards: readonly Board[]) {
  return { plies: boards.map(({ material, thickness }) => [material, thickness]), bond: bondOf(boards) };
}

function connectionOf({ connection, spacing }: Cavity) {
  const spaced = spacing !== null && connection !== "clips" && connection !== "none";
  return { kind: connection, ...(spaced && { spacing }) };
}

function doubleOf({ leaves, cavities: [cavity] }: Stack) {
  return {
    kind: "double",
    leaf1: leafOf(leaves[0]),
    leaf2: leafOf(leaves[1]),
    cavity: cavity.thickness,
    fill: Math.min(cavity.fill, cavity.thickness),
    ...(cavity.flowResistivity !== null && { flow_resistivity: cavity.flowResistivity }),
    connection: connectionOf(cavity),
  };
}

const described = new WeakMap<Construction, Description | null>();

/**
 * The model description that follows from a construction's layers; null where they do not say enough (no board, a
 * material that is not in the table, three and more leaves, two cavities without a leaf between them).
 */
export function describeLayers(construction: Construction): Description | null {
  const known = described.get(construction);
  if (known !== undefined) return known;
  const description = construction.description ?? readLayers(construction);
  described.set(construction, description);
  return description;
}

function readLayers({ layers, size, use }: Construction): Description | null {
  const stack = stackOf(layers);
  if (!stack || stack.leaves.length === 0 || stack.leaves.length > 2) return null;
  const isDouble = stack.leaves.length === 2;
  const shape = isDouble ? doubleOf(stack) : { kind: "single", leaf: leafOf(stack.leaves[0]) };
  const reading = descriptionSchema.safeParse({
    ...shape,
    ...(size && { size }),
    ...(isDouble && use && { use }),
  });
  return reading.success ? reading.data : null;
}

/** Number of leaves that count for transmission loss; 0 where the layers do not say. */
export function countLeaves({ layers, description }: Construction): number {
  if (description) return description.kind === "double" ? 2 : 1;
  return stackOf(layers)?.leaves.length ?? 0;
}

/** Surface mass of all boards, kg/m2, those outside a ventilated gap too; null where a material is not in the table. */
export function massOf({ layers }: Construction): number | null {
  const boards = layers.filter((layer) => layer.kind === "board");
  const mass = boards.reduce(
    (sum, { material, thickness }) => sum + (findMaterial(material)?.density ?? NaN) * thickness,
    0,
  );
  return boards.length === 0 || Number.isNaN(mass) ? null : mass;
}

/** Thickness of all layers, m; null without layers. */
export function thicknessOf({ layers }: Construction): number | null {
  return layers.length === 0 ? null : layers.reduce((sum, { thickness }) => sum + thickness, 0);
}
