import { signInRoute, signOutRoute } from "@/app/_server/sessionRoutes";

export const POST = signInRoute;
export const DELETE = signOutRoute;
