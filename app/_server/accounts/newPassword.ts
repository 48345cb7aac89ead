import "server-only";
import { z } from "zod";
import { KnownBrowser, Session, User } from "@/models";
import { answer, jsonAnswer } from "../answer";
import { databaseNow } from "../moments";
import { hashPassword } from "../passwords";
import { readBody, requireSameOrigin } from "../request";
import { read } from "../sessionRoutes";
import { inTransaction } from "../transactions";
import { passwordField, tokenField } from "./fields";
import { endTokens, readToken, useToken, writeLetter } from "./mailTokens";
import { requireGoodPassword } from "./passwordRules";
import { countTry, forget, networkOf, takeBack } from "./throttles";

const form = z.strictObject({ token: tokenField, password: passwordField });

/** Takes a new password from who has the link. All sessions end and none begins; the mailbox is shown to be theirs. */
export function newPasswordRoute(request: Request): Promise<Response> {
  return answer(async () => {
    requireSameOrigin(request);
    const { token, password } = read(form, await readBody(request));
    const counted = [{ rule: "link of a letter from an address", subject: networkOf(request) } as const];
    await countTry(counted);
    const { userId } = await readToken(token, "password");
    await takeBack(counted);
    const user = await User.findOne({ where: { id: userId }, rejectOnEmpty: true });
    requireGoodPassword(password, user);
    const passwordHash = await hashPassword(password);
    await inTransaction(async (transaction) => {
      await useToken(token, "password", transaction);
      const emailCheckedAt = user.emailCheckedAt ?? databaseNow();
      await user.update({ passwordHash, emailCheckedAt }, { fields: ["passwordHash", "emailCheckedAt"], transaction });
      await Session.destroy({ where: { userId }, transaction });
      await KnownBrowser.destroy({ where: { userId }, transaction });
      await endTokens(userId, ["check", "move"], transaction);
      await writeLetter({ letter: "passwordChanged", to: user.email, path: "/forgotten-password" }, transaction);
    });
    await forget([{ rule: "sign-in of an account", subject: user.email }]);
    return jsonAnswer({ next: "/sign-in" });
  });
}
