import { proofRoute } from "@/app/_server/accounts/proof";

export const POST = proofRoute;
