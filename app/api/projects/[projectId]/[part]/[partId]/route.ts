import { actOnPart, changeOne, removeOne, type OnePartParams } from "@/app/_server/partRoutes";
import { projectRoute } from "@/app/_server/projectRoute";

export const PATCH = projectRoute<OnePartParams>(actOnPart, ({ params, body, ...place }) =>
  changeOne(place, params, body),
);

export const DELETE = projectRoute<OnePartParams>(actOnPart, ({ params, ...place }) => removeOne(place, params));
