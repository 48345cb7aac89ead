import { emailMoveWishRoute } from "@/app/_server/accounts/emailMove";

export const POST = emailMoveWishRoute;
