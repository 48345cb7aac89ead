import type { Plan } from "../../lib/noise/plan";
import { changeOf, type FieldSpec } from "../plan/fieldSpec";

const OUTDOORS = "outdoors";

/** Name of a boundary and the two spaces it lies between. */
export function boundarySpecs({ spaces }: Plan, { id, name, fromSpaceId, toSpaceId }: Plan["paths"][number]): FieldSpec[] {
  const rooms = spaces.map((space) => ({ value: space.id, label: space.name }));
  return [
    { kind: "words", label: "Name of the boundary", value: name, most: 120, wide: true, changes: (value) => changeOf("paths", id, { name: value }) },
    { kind: "choice", label: "From room", value: fromSpaceId, choices: rooms.filter(({ value }) => value !== toSpaceId), changes: (value) => changeOf("paths", id, { fromSpaceId: value }) },
    {
      kind: "choice",
      label: "To",
      value: toSpaceId ?? OUTDOORS,
      choices: [{ value: OUTDOORS, label: "outdoors" }, ...rooms.filter(({ value }) => value !== fromSpaceId)],
      changes: (value) => changeOf("paths", id, { toSpaceId: value === OUTDOORS ? null : value }),
    },
  ];
}
