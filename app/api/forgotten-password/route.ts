import { forgottenPasswordRoute } from "@/app/_server/accounts/forgottenPassword";

export const POST = forgottenPasswordRoute;
