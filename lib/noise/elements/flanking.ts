import { z } from "zod";
import { elementKind } from "./kind";
import { passingOf } from "./passing";

export const flankingKind = elementKind({
  name: "flanking",
  label: "Flanking path",
  path: "flanking",
  constructed: true,
  params: z.object({}),
  passing: ({ area, loss }) => passingOf(area, loss),
});
