import { z } from "zod";
import { elementKind } from "./kind";
import { passingOf } from "./passing";

export const floorKind = elementKind({
  name: "floor",
  label: "Floor",
  path: "floor",
  constructed: true,
  params: z.object({}),
  passing: ({ area, loss }) => passingOf(area, loss),
});
