import { newPasswordRoute } from "@/app/_server/accounts/newPassword";

export const POST = newPasswordRoute;
