import "server-only";
import { createHash, createHmac, randomUUID } from "node:crypto";
import { Op, type Transaction } from "sequelize";
import { MailToken } from "@/models";
import { env } from "../env";
import { notFound } from "../errors";
import { writeJob } from "../jobs/queue";
import type { LetterName } from "../mail/letters";
import { databaseNow, fromNow } from "../moments";

export type Purpose = MailToken["purpose"];

const HOUR = 3_600;
const lifetimes: Record<Purpose, number> = { check: 24 * HOUR, password: HOUR / 2, move: HOUR, undo: 7 * 24 * HOUR };

/**
 * The 256 bits of a link. They follow from the id of the job that mails them and from our own secret, so that a try that
 * is repeated mails the same link though only its hash is stored.
 */
export const tokenOf = (jobId: string) => createHmac("sha256", env().pepper).update(`mail token ${jobId}`).digest("base64url");

const hashOf = (token: string) => createHash("sha256").update(token).digest("hex");
const living = (token: string) => ({ tokenHash: hashOf(token), usedAt: null, expiresAt: { [Op.gt]: databaseNow() } });

/** A page of ours as mails name it: from the configured address, never from what a request says of itself. */
export function linkOf(path: string, token?: string): string {
  const link = new URL(path, env().origin.origin);
  if (token) link.searchParams.set("token", token);
  return link.href;
}

interface Linked {
  userId: string;
  purpose: Purpose;
  letter: LetterName;
  to: string;
  path: string;
  /** The address that `move` and `undo` lead to. */
  email?: string;
}

/** A letter with a link that can be used once. Older links of the same purpose end, but for a way back: it cannot be cut off. */
export async function writeLinkedLetter({ userId, purpose, email, ...payload }: Linked, transaction: Transaction): Promise<void> {
  const id = randomUUID();
  if (purpose !== "undo") await endTokens(userId, [purpose], transaction);
  const row = { tokenHash: hashOf(tokenOf(id)), userId, purpose, email: email ?? null, expiresAt: fromNow(lifetimes[purpose]) };
  await MailToken.create(row, { fields: ["tokenHash", "userId", "purpose", "email", "expiresAt"], transaction });
  await writeJob({ id, kind: "letter", payload: { ...payload, token: true } }, transaction);
}

/** A letter whose link is an open page. */
export async function writeLetter(payload: { letter: LetterName; to: string; path: string }, transaction: Transaction): Promise<void> {
  await writeJob({ kind: "letter", payload: { ...payload, token: false } }, transaction);
}

export async function endTokens(userId: string, purposes: Purpose[], transaction: Transaction): Promise<void> {
  await MailToken.destroy({ where: { userId, purpose: purposes, usedAt: null }, transaction });
}

/** Ends the ways back that were opened after one that was used: they lead to where it leads away from. */
export async function endLaterUndos({ userId, madeAt }: MailToken, transaction: Transaction): Promise<void> {
  await MailToken.destroy({ where: { userId, purpose: "undo", usedAt: null, madeAt: { [Op.gt]: madeAt } }, transaction });
}

export async function tokenHolds(token: string): Promise<boolean> {
  return (await MailToken.count({ where: living(token) })) === 1;
}

/** Whose link it is, without using it; one that is used, ended, expired or was never made does not exist. */
export async function readToken(token: string, purpose: Purpose): Promise<MailToken> {
  const found = await MailToken.findOne({ where: { ...living(token), purpose } });
  if (!found) throw notFound();
  return found;
}

/** Uses a link up. Of many who do so at the same moment one succeeds. */
export async function useToken(token: string, purpose: Purpose, transaction: Transaction): Promise<MailToken> {
  const values = { usedAt: databaseNow() };
  const [, rows] = await MailToken.update(values, { where: { ...living(token), purpose }, fields: ["usedAt"], returning: true, transaction });
  const used = rows[0];
  if (!used) throw notFound();
  return used;
}
