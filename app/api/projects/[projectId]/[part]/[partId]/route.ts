import { actOnPart, changeOne, kindOf, type OnePartParams } from "@/app/_server/partRoutes";
import { projectRoute } from "@/app/_server/projectRoute";
import { removePart } from "@/models/parts";

export const PATCH = projectRoute<OnePartParams>(actOnPart, ({ params, body, ...place }) =>
  changeOne(place, params, body),
);

export const DELETE = projectRoute<OnePartParams>(actOnPart, ({ params, ...place }) =>
  removePart(place, kindOf(params), params.partId),
);
