import "server-only";
import { createHmac } from "node:crypto";
import { isIPv6 } from "node:net";
import { fn, Op } from "sequelize";
import { Throttle } from "@/models";
import { env } from "../env";
import { Refusal } from "../errors";
import { inTransaction } from "../transactions";
import { judge, rules, type RuleName } from "./throttleRules";

export interface Counted {
  rule: RuleName;
  /** What is counted: an account, an address, a browser. */
  subject: string;
}

/** What stands in the table: keyed, so that no address can be read there. */
const keyOf = ({ rule, subject }: Counted) =>
  createHmac("sha256", env().pepper).update(`throttle ${rule} ${subject}`).digest("base64url");

/**
 * Counts a try before it is made, so that a thousand at the same moment are a thousand; refuses it in words where there
 * were too many. A try that turns out well is taken back.
 */
export async function countTry(counted: readonly Counted[]): Promise<void> {
  const made: Counted[] = [];
  for (const one of counted) {
    const wait = await countOne(one);
    if (wait > 0) {
      await takeBack(made);
      throw tooMany(wait);
    }
    made.push(one);
  }
}

/** Seconds to wait; none where the try was counted. The row is held, so that tries at the same moment take turns. */
function countOne(one: Counted): Promise<number> {
  const key = keyOf(one);
  return inTransaction(async (transaction) => {
    const now = fn("clock_timestamp") as unknown as Date; // becomes a moment in the statement
    await Throttle.bulkCreate([{ key, tries: 0, since: now, lastAt: now }], { fields: ["key", "tries", "since", "lastAt"], ignoreDuplicates: true, transaction });
    const attributes = { include: [[fn("clock_timestamp"), "now"] as [ReturnType<typeof fn>, string]] };
    const row = await Throttle.findOne({ where: { key }, attributes, lock: transaction.LOCK.UPDATE, rejectOnEmpty: true, transaction });
    const { wait, next } = judge(rules[one.rule], row, row.get("now") as unknown as Date); // asked for beside the columns
    if (next) await row.update(next, { fields: ["tries", "since", "lastAt"], transaction });
    return wait;
  });
}

/** A try that was not made after all, or was no failure. */
export async function takeBack(counted: readonly Counted[]): Promise<void> {
  for (const one of counted) await Throttle.decrement("tries", { by: 1, where: { key: keyOf(one), tries: { [Op.gt]: 0 } } });
}

/** Begins a count anew. */
export async function forget(counted: readonly Counted[]): Promise<void> {
  await Throttle.destroy({ where: { key: counted.map(keyOf) } });
}

function tooMany(seconds: number): Refusal {
  return new Refusal("too many", `Too many tries. Wait ${inWords(seconds)}, then try again.`, { retryAfter: seconds });
}

function inWords(seconds: number): string {
  if (seconds < 120) return seconds === 1 ? "a second" : `${seconds} seconds`;
  const minutes = Math.ceil(seconds / 60);
  return minutes < 120 ? `${minutes} minutes` : `${Math.ceil(minutes / 60)} hours`;
}

/** Where a request comes from, as our own server wrote it down: an IPv4 address, or the network of an IPv6 one. */
export function networkOf(request: Request): string {
  const address = (request.headers.get("x-stillyard-address") ?? "").replace(/^::ffff:(?=\d+\.)/i, "").replace(/%.*$/, "");
  return isIPv6(address) ? firstHalf(address) : address;
}

/** The first 64 bits, written out. */
function firstHalf(address: string): string {
  const [head = "", tail] = address.toLowerCase().split("::");
  const before = head.split(":").filter(Boolean);
  const after = (tail ?? "").split(":").filter(Boolean);
  const zeros = tail === undefined ? [] : Array<string>(8 - before.length - after.length - (/\./.test(address) ? 1 : 0)).fill("0");
  return [...before, ...zeros, ...after].slice(0, 4).map((part) => part.replace(/^0+(?=.)/, "")).join(":");
}
