import "server-only";
import { createHash, randomBytes } from "node:crypto";
import { fn, Op, type Transaction } from "sequelize";
import { Membership, Session, User } from "@/models";
import { sealId, unsealId } from "./cookies";
import { isAlive, isProved, isToMark, isToRenew } from "./lifetimes";
import { databaseNow } from "./moments";
import { inTransaction } from "./transactions";

/** Who asks. */
export interface Reader {
  id: string;
  name: string;
  email: string;
  theme: "light" | "dark" | "system";
  /** How the reader wants figures shown. */
  figures: { units: "metric" | "us"; mark: "point" | "comma" };
  /** `proved`: the password was given a moment ago. `handle`: its name on the list of devices. */
  session: { idHash: string; handle: string; keep: boolean; toRenew: boolean; proved: boolean };
}

const LIVE_SESSIONS = 10;

const hashOf = (id: string) => createHash("sha256").update(id).digest("hex");
const freshId = () => randomBytes(32).toString("base64url");

/** The person behind a sealed cookie, or undefined. The session's row is read each time: it is what can be ended. */
export async function identify(seal: string | undefined): Promise<Reader | undefined> {
  const id = await unsealId(seal);
  const session = id && (await findSession(hashOf(id)));
  if (!session) return undefined;
  const { user } = session;
  const now = session.get("now") as unknown as Date; // asked for beside the columns
  if (!isAlive(session, user.memberships.length > 0, now)) return undefined;
  const { idHash, handle, keep } = session;
  if (isToMark(session, now)) await Session.update({ seenAt: fn("now") }, { where: { idHash }, fields: ["seenAt"] });
  return {
    id: user.id,
    name: user.name,
    email: user.email,
    theme: user.theme,
    figures: { units: user.units, mark: user.decimalMark },
    session: { idHash, handle, keep, toRenew: isToRenew(session, now), proved: isProved(session, now) },
  };
}

async function findSession(idHash: string) {
  const memberships = { model: Membership, as: "memberships" };
  const session = await Session.findOne({
    where: { idHash },
    attributes: { include: [[fn("now"), "now"]] },
    include: [{ model: User, as: "user", required: true, include: [memberships] }],
  });
  // The two includes above.
  return session as (Session & { now: Date; user: User & { memberships: Membership[] } }) | null;
}

interface Opening {
  userId: string;
  keep: boolean;
  device: string;
}

/** The sealed id of a new session. Of an account that has too many go ids that were replaced, then the oldest. */
export async function openSession({ userId, keep, device }: Opening, transaction: Transaction): Promise<string> {
  const id = freshId();
  const idHash = hashOf(id);
  // The account's row is held, so that two sign-ins count one after the other.
  await User.findOne({ where: { id: userId }, lock: transaction.LOCK.UPDATE, transaction });
  const fields: ("idHash" | "userId" | "keep" | "device")[] = ["idHash", "userId", "keep", "device"];
  await Session.create({ idHash, userId, keep, device: device.slice(0, 200) }, { fields, transaction });
  const live = await Session.findAll({ where: { userId }, order: [["replacedAt", "ASC NULLS FIRST"], ["seenAt", "DESC"]], transaction });
  const newest = [...live.filter((one) => one.idHash === idHash), ...live.filter((one) => one.idHash !== idHash)];
  const gone = newest.slice(LIVE_SESSIONS).map((one) => one.idHash);
  if (gone.length) await Session.destroy({ where: { idHash: { [Op.in]: gone } }, transaction });
  return sealId(id);
}

/** Ends the session behind a cookie, at once and for every copy of it, also under the id it had or got a moment ago. */
export async function signOut(seal: string | undefined): Promise<void> {
  const id = await unsealId(seal);
  const session = id && (await Session.findOne({ where: { idHash: hashOf(id) } }));
  if (session) await Session.destroy({ where: { userId: session.userId, handle: session.handle } });
}

/**
 * A new id for a session: each day, and when its password was given again. The old one holds a minute more, without that
 * proof; of two askers one renews.
 */
export async function renewSession({ session }: Reader, { proved = false } = {}): Promise<string | undefined> {
  const id = freshId();
  const renewed = await inTransaction(async (transaction) => {
    const { idHash } = session;
    const old = await Session.findOne({ where: { idHash, replacedAt: null }, lock: transaction.LOCK.UPDATE, transaction });
    if (!old) return false;
    // Ids replaced before this one was given have long had their minute.
    await Session.destroy({ where: { userId: old.userId, replacedAt: { [Op.lt]: old.issuedAt } }, transaction });
    await old.update({ replacedAt: databaseNow() }, { fields: ["replacedAt"], transaction });
    const { userId, keep, device, handle, beganAt } = old;
    const row = { idHash: hashOf(id), userId, keep, device, handle, beganAt, provedAt: proved ? databaseNow() : old.provedAt };
    await Session.create(row, { fields: ["idHash", "userId", "keep", "device", "handle", "beganAt", "provedAt"], transaction });
    return true;
  });
  return renewed ? sealId(id) : undefined;
}
