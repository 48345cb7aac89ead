import "server-only";
import { z } from "zod";
import { User } from "@/models";
import { answer, emptyAnswer, requireReader } from "../answer";
import { setCookie } from "../cookies";
import { Refusal } from "../errors";
import { renewSession, type Reader } from "../identity";
import { matchesPassword } from "../passwords";
import { readBody, requireSameOrigin } from "../request";
import { read } from "../sessionRoutes";
import { countTry, forget, takeBack } from "./throttles";

const form = z.strictObject({ password: z.string().min(1, "Type your password.").max(1_000) });

/** Refuses what asks for the password again, unless it was given in this session within ten minutes. */
export function requireProof(reader: Reader): void {
  if (!reader.session.proved) throw new Refusal("reauthenticate", "Give your password again for this.");
}

/** Takes the password again. The session gets a new id, and with it ten minutes for what asks for it. */
export function proofRoute(request: Request): Promise<Response> {
  return answer(async () => {
    requireSameOrigin(request);
    const reader = await requireReader(request);
    const { password } = read(form, await readBody(request));
    await requirePassword(reader, password, "password");
    const seal = await renewSession(reader, { proved: true });
    // Another request of this browser gave the session its new id a moment ago.
    if (!seal) throw new Refusal("conflict", "That came twice at once. Try again.");
    return emptyAnswer({ "Set-Cookie": setCookie(seal, reader.session.keep) });
  });
}

/** Refuses where it is not the reader's password; tries are counted as those to sign in are. */
export async function requirePassword(reader: Reader, password: string, field: string): Promise<User> {
  const counted = [{ rule: "password again", subject: reader.id } as const];
  await countTry(counted);
  const user = await User.findOne({ where: { id: reader.id }, rejectOnEmpty: true });
  const fits = await matchesPassword(password, user.passwordHash).catch(async (thrown: unknown) => {
    await takeBack(counted);
    throw thrown;
  });
  if (!fits) throw new Refusal("invalid", "This is not your password.", { fields: { [field]: "This is not your password." } });
  await forget(counted);
  return user;
}
