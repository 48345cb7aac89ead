import { z } from "zod";
import { elementKind } from "./kind";
import { passingOf } from "./passing";

export const ceilingKind = elementKind({
  name: "ceiling",
  label: "Ceiling",
  path: "floor",
  constructed: true,
  params: z.object({}),
  passing: ({ area, loss }) => passingOf(area, loss),
});
