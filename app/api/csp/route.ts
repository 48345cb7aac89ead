import { reportRoute } from "@/app/_server/reports";

export const POST = reportRoute;
