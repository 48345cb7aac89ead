import "server-only";
import { randomUUID } from "node:crypto";
import type { Transaction } from "sequelize";
import { z } from "zod";
import { connection, Membership, Team, User } from "@/models";
import { answer } from "../answer";
import { databaseCode } from "../errors";
import { hashPassword } from "../passwords";
import { readBody, requireSameOrigin } from "../request";
import { read } from "../sessionRoutes";
import { inTransaction } from "../transactions";
import { accepted } from "./accepted";
import { emailField, nameField, passwordField } from "./fields";
import { writeLetter, writeLinkedLetter } from "./mailTokens";
import { requireGoodPassword } from "./passwordRules";
import { countTry, networkOf } from "./throttles";

const form = z.strictObject({
  name: nameField,
  email: emailField,
  password: passwordField,
  hat: z.enum(["play", "advise", "build"]),
});

/** Signs up. Whether the address was known shows in the mail alone: answer and work are the same. */
export function signUpRoute(request: Request): Promise<Response> {
  return answer(async () => {
    requireSameOrigin(request);
    const { password, ...wanted } = read(form, await readBody(request));
    requireGoodPassword(password, wanted);
    await countTry([{ rule: "sign-up from an address", subject: networkOf(request) }]);
    const account = { ...wanted, passwordHash: await hashPassword(password) };
    await takeIn(account).catch((thrown: unknown) => {
      // Somebody else signed up under this address at the same moment.
      if (databaseCode(thrown) !== "23505") throw thrown;
      return takeIn(account);
    });
    return accepted();
  });
}

interface Account {
  name: string;
  email: string;
  passwordHash: string;
  hat: "play" | "advise" | "build";
}

async function takeIn(account: Account): Promise<void> {
  await inTransaction(async (transaction) => {
    const { email } = account;
    const known = await User.findOne({ where: { email }, lock: transaction.LOCK.UPDATE, transaction });
    if (known?.emailCheckedAt) {
      await pretend(account, transaction);
      return writeLetter({ letter: "alreadyHere", to: email, path: "/forgotten-password" }, transaction);
    }
    // Who never showed that the address is theirs is replaced by who asks for it now.
    if (known) await replaceUnchecked(known, account, transaction);
    else await addAccount(account, transaction);
  });
}

/** An account with a team of its own, and the letter by which the address is checked. */
async function addAccount({ name, ...account }: Account, transaction: Transaction): Promise<void> {
  const user = { ...account, id: randomUUID(), name, emailCheckedAt: null };
  const team = { id: randomUUID(), name };
  await Team.create(team, { fields: ["id", "name"], transaction });
  await User.create(user, { fields: ["id", "name", "email", "passwordHash", "hat", "emailCheckedAt"], transaction });
  await Membership.create({ teamId: team.id, userId: user.id, role: "owner" }, { fields: ["teamId", "userId", "role"], transaction });
  await writeCheck(user, transaction);
}

async function replaceUnchecked(known: User, { name, passwordHash, hat }: Account, transaction: Transaction): Promise<void> {
  await known.update({ name, passwordHash, hat }, { fields: ["name", "passwordHash", "hat"], transaction });
  await writeCheck(known, transaction);
}

function writeCheck({ id, email }: { id: string; email: string }, transaction: Transaction): Promise<void> {
  return writeLinkedLetter({ userId: id, purpose: "check", letter: "check", to: email, path: "/email-check" }, transaction);
}

/** The work of adding an account, undone: a known address must not be told by its quicker answer. */
async function pretend(account: Account, transaction: Transaction): Promise<void> {
  const undo = new Error("undone");
  await connection
    .transaction({ transaction }, async (inner) => {
      await addAccount({ ...account, email: `${randomUUID()}@stillyard.invalid` }, inner);
      throw undo;
    })
    .catch((thrown: unknown) => {
      if (thrown !== undo) throw thrown;
    });
}
