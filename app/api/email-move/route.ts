import { emailMoveRoute } from "@/app/_server/accounts/emailMove";

export const POST = emailMoveRoute;
