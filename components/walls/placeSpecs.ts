import type { Plan } from "../../lib/noise/plan";
import { changeOf, type FieldSpec } from "../plan/fieldSpec";
import type { PathElement } from "./elementWords";
import { FACES, faceOf, faceWords, normalOf, placeInFace, sizeOfFace, toMillimetre, type Face, type Spot } from "./faces";
import { isSurface } from "./newElement";

const REACH = 1000;
const OTHERWISE = "otherwise";

const standingIn = (plan: Plan, id: string) => plan.elements.find((one) => one.id === id);

const boxOf = ({ paths, spaces }: Plan, { pathId }: PathElement) => {
  const path = paths.find(({ id }) => id === pathId);
  return spaces.find(({ id }) => id === path?.fromSpaceId)?.box ?? null;
};

/** Name and boundary of an element. */
export function identitySpecs(plan: Plan, { id, name, pathId }: PathElement): FieldSpec[] {
  return [
    { kind: "words", label: "Name", value: name, most: 120, changes: (value) => changeOf("elements", id, { name: value }) },
    {
      kind: "choice",
      label: "It stands in",
      value: pathId,
      choices: plan.paths.map((path) => ({ value: path.id, label: path.name })),
      changes: (value) => changeOf("elements", id, { pathId: value }),
    },
  ];
}

/** Where an element to outdoors stands and which way it looks, m. */
export function whereSpecs({ id, position, normal }: PathElement): FieldSpec[] {
  const figure = (axis: 0 | 1 | 2, label: string): FieldSpec => ({
    kind: "quantity",
    quantity: "length",
    label,
    value: position?.[axis] ?? null,
    min: -REACH,
    max: REACH,
    changes: (value, plan) => {
      const standing = standingIn(plan, id);
      if (!standing || value === null) return [];
      const from = standing.position ?? middleOfRoom(plan, standing);
      return changeOf("elements", id, { position: from.map((was, index) => (index === axis ? value : was)) });
    },
  });
  return [facesSpec(id, normal), figure(0, "Centre, east"), figure(1, "Centre, north"), figure(2, "Centre over ground")];
}

function facesSpec(id: string, normal: PathElement["normal"]): FieldSpec {
  const face = faceOf(normal);
  const other = normal === null ? [{ value: OTHERWISE, label: "not known yet" }] : face === null ? [{ value: OTHERWISE, label: "turned otherwise" }] : [];
  return {
    kind: "choice",
    label: "It faces",
    value: face ?? OTHERWISE,
    choices: [...FACES.map((one) => ({ value: one, label: faceWords[one] })), ...other],
    hint: "Another face puts it into the middle of that face of its room.",
    changes: (value, plan) => {
      const chosen = FACES.find((one) => one === value);
      const standing = standingIn(plan, id);
      return chosen && standing ? changeOf("elements", id, { normal: normalOf(chosen), ...turnedTo(plan, standing, chosen) }) : [];
    },
  };
}

function turnedTo(plan: Plan, element: PathElement, face: Face): { position?: Spot } {
  const box = boxOf(plan, element);
  if (!box) return {};
  const [across, up] = sizeOfFace(box, face);
  const over = face !== "roof" && element.position ? element.position[2] - box.at[2] : up / 2;
  return { position: placeInFace(box, face, across / 2, toMillimetre(over)) };
}

function middleOfRoom(plan: Plan, element: PathElement): Spot {
  const box = boxOf(plan, element);
  return box ? (box.at.map((from, axis) => toMillimetre(from + box.size[axis]! / 2)) as Spot) : [0, 0, 1];
}

/** Width and height, m. The area of an opening follows them; that of a wall is its own, for its openings are not in it. */
export function extentSpecs({ id, size, kind }: PathElement): FieldSpec[] {
  if (kind === "leak" || kind === "duct") return [];
  const side = (at: 0 | 1, label: string): FieldSpec => ({
    kind: "quantity",
    quantity: "length",
    label,
    value: size?.[at] ?? null,
    min: 0.001,
    max: REACH,
    hint: at === 1 && !isSurface(kind) ? "Its area follows." : undefined,
    changes: (value, plan) => {
      const standing = standingIn(plan, id);
      if (!standing || value === null) return [];
      const other = standing.size?.[at === 0 ? 1 : 0] ?? toMillimetre(standing.area / value);
      const sides = at === 0 ? [value, other] : [other, value];
      return changeOf("elements", id, { size: sides, ...(isSurface(kind) ? {} : { area: toMillimetre(sides[0]! * sides[1]!) }) });
    },
  });
  return [side(0, "Width"), side(1, kind === "roof" ? "Depth" : "Height")];
}

/** What the solver would otherwise take from the geometry and the method. */
export function methodSpecs({ id, directivity, diffuseness, limit }: PathElement): FieldSpec[] {
  const figure = (field: string, label: string, value: number | null, [min, max]: [number, number], hint: string): FieldSpec => ({
    kind: "number",
    unit: "dB",
    label,
    value,
    min,
    max,
    optional: true,
    hint,
    changes: (typed) => changeOf("elements", id, { [field]: typed }),
  });
  return [
    figure("directivity", "Directivity", directivity, [-30, 20], "Empty follows where the listener stands."),
    figure("diffuseness", "Diffuseness", diffuseness, [-20, 0], "Empty is −6 dB, a diffuse room (EN 12354-4)."),
    figure("limit", "Field limit", limit, [0, 120], "The most that a building lets it stop. Empty is none."),
  ];
}
