import { changePasswordRoute } from "@/app/_server/accounts/changePassword";

export const POST = changePasswordRoute;
