import { emailUndoRoute } from "@/app/_server/accounts/emailMove";

export const POST = emailUndoRoute;
