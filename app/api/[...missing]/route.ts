import { missingRoute } from "@/app/_server/missingRoute";

export const GET = missingRoute;
export const POST = missingRoute;
export const PUT = missingRoute;
export const PATCH = missingRoute;
export const DELETE = missingRoute;
