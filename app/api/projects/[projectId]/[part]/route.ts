import { actOnPart, addOne, type PartParams } from "@/app/_server/partRoutes";
import { projectRoute } from "@/app/_server/projectRoute";

export const POST = projectRoute<PartParams>(actOnPart, ({ params, body, ...place }) => addOne(place, params, body));
