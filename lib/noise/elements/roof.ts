import { z } from "zod";
import { elementKind } from "./kind";
import { passingOf } from "./passing";

export const roofKind = elementKind({
  name: "roof",
  label: "Roof",
  path: "roof",
  constructed: true,
  params: z.object({}),
  passing: ({ area, loss }) => passingOf(area, loss),
});
