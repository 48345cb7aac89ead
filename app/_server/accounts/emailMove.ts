import "server-only";
import { randomBytes } from "node:crypto";
import { Op } from "sequelize";
import { z } from "zod";
import { KnownBrowser, Session, User } from "@/models";
import { answer, jsonAnswer, requireReader } from "../answer";
import { databaseCode, notFound, Refusal } from "../errors";
import { hashPassword } from "../passwords";
import { readBody, requireSameOrigin } from "../request";
import { read } from "../sessionRoutes";
import { inTransaction } from "../transactions";
import { accepted } from "./accepted";
import { emailField, tokenField } from "./fields";
import { endLaterUndos, endTokens, readToken, useToken, writeLetter, writeLinkedLetter } from "./mailTokens";
import { requireProof } from "./proof";
import { removeUnchecked } from "./removeUnchecked";
import { countTry } from "./throttles";

const wish = z.strictObject({ email: emailField });
const link = z.strictObject({ token: tokenField });

/**
 * Asks for the account to move to another address: a link goes there, and one to undo it to the address of now. That
 * somebody else has the new address is told by mail alone.
 */
export function emailMoveWishRoute(request: Request): Promise<Response> {
  return answer(async () => {
    requireSameOrigin(request);
    const reader = await requireReader(request);
    requireProof(reader);
    const { email } = read(wish, await readBody(request));
    if (email === reader.email) throw new Refusal("invalid", "This value does not fit.", { fields: { email: "This is your address already." } });
    await countTry([{ rule: "move to another address", subject: reader.id }]);
    await inTransaction(async (transaction) => {
      const taken = await User.count({ where: { email, emailCheckedAt: { [Op.ne]: null } }, transaction });
      const there = { userId: reader.id, purpose: "move", letter: "move", to: email, path: "/email-move", email } as const;
      if (taken) await writeLetter({ letter: "alreadyHere", to: email, path: "/forgotten-password" }, transaction);
      else await writeLinkedLetter(there, transaction);
      const back = { userId: reader.id, purpose: "undo", letter: "undo", to: reader.email, path: "/email-undo", email: reader.email } as const;
      await writeLinkedLetter(back, transaction);
    });
    return accepted();
  });
}

/** Moves the account to the address that the link went to. */
export function emailMoveRoute(request: Request): Promise<Response> {
  return answer(async () => {
    requireSameOrigin(request);
    const { token } = read(link, await readBody(request));
    await inTransaction(async (transaction) => {
      const { userId, email } = await useToken(token, "move", transaction);
      await removeUnchecked({ email: email! }, transaction); // every such link has one
      await User.update({ email: email! }, { where: { id: userId }, fields: ["email"], transaction });
      await endTokens(userId, ["password"], transaction);
    }).catch(refuseTaken);
    return jsonAnswer({ next: "/sign-in" });
  });
}

/** Somebody signed up under the address since the link went out: nothing moved, and the link is as dead as any. */
function refuseTaken(thrown: unknown): never {
  throw databaseCode(thrown) === "23505" ? notFound() : thrown;
}

/** Takes a move back, also one that was made: the old address holds, all sessions and the password end. */
export function emailUndoRoute(request: Request): Promise<Response> {
  return answer(async () => {
    requireSameOrigin(request);
    const { token } = read(link, await readBody(request));
    await readToken(token, "undo");
    // Whoever moved it may know the password.
    const passwordHash = await hashPassword(randomBytes(32).toString("base64url"));
    await inTransaction(async (transaction) => {
      const used = await useToken(token, "undo", transaction);
      const { userId } = used;
      const old = used.email!; // every such link has one
      await endLaterUndos(used, transaction);
      await removeUnchecked({ email: old }, transaction);
      await User.update({ email: old, passwordHash }, { where: { id: userId }, fields: ["email", "passwordHash"], transaction });
      await Session.destroy({ where: { userId }, transaction });
      await KnownBrowser.destroy({ where: { userId }, transaction });
      await endTokens(userId, ["move", "password"], transaction);
      await writeLinkedLetter({ userId, purpose: "password", letter: "password", to: old, path: "/new-password" }, transaction);
    }).catch(refuseTaken);
    return jsonAnswer({ next: "/sign-in" });
  });
}
