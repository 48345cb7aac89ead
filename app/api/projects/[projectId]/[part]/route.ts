import { actOnPart, kindOf, type PartParams } from "@/app/_server/partRoutes";
import { projectRoute } from "@/app/_server/projectRoute";
import { addPart } from "@/models/parts";

export const POST = projectRoute<PartParams>(actOnPart, ({ params, body, ...place }) =>
  addPart(place, kindOf(params), withoutId(body)),
);

/** Ids are given here, not by the asker. */
const withoutId = ({ id: _, ...values }: Record<string, unknown>) => values;
