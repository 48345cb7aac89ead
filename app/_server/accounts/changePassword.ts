import "server-only";
import { z } from "zod";
import { Session } from "@/models";
import { answer, emptyAnswer, requireReader } from "../answer";
import { setCookie } from "../cookies";
import { openSession } from "../identity";
import { hashPassword } from "../passwords";
import { readBody, requireSameOrigin } from "../request";
import { read } from "../sessionRoutes";
import { inTransaction } from "../transactions";
import { passwordField } from "./fields";
import { endTokens, writeLetter } from "./mailTokens";
import { requireGoodPassword } from "./passwordRules";
import { requirePassword } from "./proof";

const form = z.strictObject({ current: z.string().min(1, "Type the password you have now.").max(1_000), password: passwordField });

/** Changes the reader's password. Every session ends, this browser gets a new one, and a letter tells the owner. */
export function changePasswordRoute(request: Request): Promise<Response> {
  return answer(async () => {
    requireSameOrigin(request);
    const reader = await requireReader(request);
    const { current, password } = read(form, await readBody(request));
    const user = await requirePassword(reader, current, "current");
    requireGoodPassword(password, user);
    const passwordHash = await hashPassword(password);
    const { keep } = reader.session;
    const seal = await inTransaction(async (transaction) => {
      await user.update({ passwordHash }, { fields: ["passwordHash"], transaction });
      await Session.destroy({ where: { userId: user.id }, transaction });
      await endTokens(user.id, ["password"], transaction);
      await writeLetter({ letter: "passwordChanged", to: user.email, path: "/forgotten-password" }, transaction);
      return openSession({ userId: user.id, keep, device: request.headers.get("user-agent") ?? "" }, transaction);
    });
    return emptyAnswer({ "Set-Cookie": setCookie(seal, keep) });
  });
}
