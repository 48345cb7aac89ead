import { emailCheckRoute } from "@/app/_server/accounts/emailCheck";

export const POST = emailCheckRoute;
