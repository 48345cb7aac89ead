import { settingsRoute } from "@/app/_server/settingsRoute";

export const PATCH = settingsRoute;
