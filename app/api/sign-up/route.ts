import { signUpRoute } from "@/app/_server/accounts/signUp";

export const POST = signUpRoute;
