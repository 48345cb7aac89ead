import { changeMany } from "@/app/_server/changeMany";
import { projectRoute } from "@/app/_server/projectRoute";

export const POST = projectRoute<{ projectId: string }>("edit plan", ({ body, ...place }) => changeMany(place, body));
