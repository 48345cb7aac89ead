import { z } from "zod";
import { elementKind } from "./kind";
import { passingOf } from "./passing";

export const wallKind = elementKind({
  name: "wall",
  label: "Wall",
  path: "wall",
  constructed: true,
  params: z.object({}),
  passing: ({ area, loss }) => passingOf(area, loss),
});
