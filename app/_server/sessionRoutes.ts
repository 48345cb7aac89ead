import "server-only";
import { z } from "zod";
import { fieldWords } from "@/models/parts";
import { answer, emptyAnswer, jsonAnswer } from "./answer";
import { signIn } from "./accounts/signIn";
import { networkOf } from "./accounts/throttles";
import { clearCookie, readBrowserSeal, readSeal, setBrowserCookie, setCookie } from "./cookies";
import { Refusal } from "./errors";
import { signOut } from "./identity";
import { readBody, requireSameOrigin } from "./request";

const form = z.strictObject({
  email: z.string().min(1).max(254),
  password: z.string().min(1).max(256),
  keep: z.boolean().default(false),
  next: z.string().max(2048).optional(),
});

/** Signs in. An unknown address and a wrong password get the same answer after the same work. */
export function signInRoute(request: Request): Promise<Response> {
  return answer(async () => {
    requireSameOrigin(request);
    const { keep, next, ...credentials } = read(form, await readBody(request));
    const device = request.headers.get("user-agent") ?? "";
    const seals = { old: readSeal(request), browser: readBrowserSeal(request) };
    const { seal, browserSeal } = await signIn({ ...credentials, keep, device, network: networkOf(request) }, seals);
    const response = jsonAnswer({ next: ownAddress(next) }, { "Set-Cookie": setCookie(seal, keep) });
    response.headers.append("Set-Cookie", setBrowserCookie(browserSeal));
    return response;
  });
}

/** Signs out: the session ends in the database, whoever else holds its cookie. */
export function signOutRoute(request: Request): Promise<Response> {
  return answer(async () => {
    requireSameOrigin(request);
    await signOut(readSeal(request));
    return emptyAnswer({ "Set-Cookie": clearCookie(), "Clear-Site-Data": '"cache"' });
  });
}

/** A value as its schema reads it; what does not fit is refused field by field. */
export function read<T>(schema: z.ZodType<T>, value: unknown): T {
  const result = schema.safeParse(value);
  if (!result.success) throw new Refusal("invalid", "This value does not fit.", { fields: fieldWords(result.error.issues) });
  return result.data;
}

/** A way back that stays in the product: a path of our own, or the list of yards. */
function ownAddress(next: string | undefined): string {
  const ours = next !== undefined && /^\/(?![/\\])[\w\-./]*$/.test(next) && !next.startsWith("/api/");
  return ours ? next : "/projects";
}
