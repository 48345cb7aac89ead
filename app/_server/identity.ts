import "server-only";
import { createHash, randomBytes } from "node:crypto";
import { fn, Op } from "sequelize";
import { Membership, Session, User } from "@/models";
import { sealId, unsealId } from "./cookies";
import { isAlive, isToMark, isToRenew } from "./lifetimes";
import { hashPassword, isCheaper, matchesPassword } from "./passwords";
import { inTransaction } from "./transactions";

/** Who asks. */
export interface Reader {
  id: string;
  name: string;
  email: string;
  theme: "light" | "dark" | "system";
  /** How the reader wants figures shown. */
  figures: { units: "metric" | "us"; mark: "point" | "comma" };
  session: { idHash: string; keep: boolean; toRenew: boolean };
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
  const { idHash, keep } = session;
  if (isToMark(session, now)) await Session.update({ seenAt: fn("now") }, { where: { idHash }, fields: ["seenAt"] });
  return {
    id: user.id,
    name: user.name,
    email: user.email,
    theme: user.theme,
    figures: { units: user.units, mark: user.decimalMark },
    session: { idHash, keep, toRenew: isToRenew(session, now) },
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

export interface Credentials {
  email: string;
  password: string;
  keep: boolean;
  device: string;
}

/** A sealed id of a new session, or undefined where address and password do not fit. Both take the same work. */
export async function signIn({ email, password, keep, device }: Credentials, oldSeal?: string): Promise<string | undefined> {
  const user = await User.findOne({ where: { email: email.trim().toLowerCase() } });
  const fits = await matchesPassword(password, user?.passwordHash);
  if (!fits || !user) return undefined;
  if (isCheaper(user.passwordHash)) await user.update({ passwordHash: await hashPassword(password) }, { fields: ["passwordHash"] });
  await signOut(oldSeal);
  const id = freshId();
  await openSession({ idHash: hashOf(id), userId: user.id, keep, device: device.slice(0, 200) });
  return sealId(id);
}

/** The newest sessions stay; of an account that has too many go ids that were replaced, then the oldest. */
async function openSession({ idHash, userId, keep, device }: { idHash: string; userId: string; keep: boolean; device: string }) {
  await inTransaction(async (transaction) => {
    // The account's row is held, so that two sign-ins count one after the other.
    await User.findOne({ where: { id: userId }, lock: transaction.LOCK.UPDATE, transaction });
    const fields: ("idHash" | "userId" | "keep" | "device")[] = ["idHash", "userId", "keep", "device"];
    await Session.create({ idHash, userId, keep, device }, { fields, transaction });
    const live = await Session.findAll({ where: { userId }, order: [["replacedAt", "ASC NULLS FIRST"], ["seenAt", "DESC"]], transaction });
    const newest = [...live.filter((one) => one.idHash === idHash), ...live.filter((one) => one.idHash !== idHash)];
    const gone = newest.slice(LIVE_SESSIONS).map((one) => one.idHash);
    if (gone.length) await Session.destroy({ where: { idHash: { [Op.in]: gone } }, transaction });
  });
}

/** Ends the session behind a cookie, at once and for every copy of it, also under the id it had or got a moment ago. */
export async function signOut(seal: string | undefined): Promise<void> {
  const id = await unsealId(seal);
  const session = id && (await Session.findOne({ where: { idHash: hashOf(id) } }));
  if (!session) return;
  const { idHash, userId, issuedAt, replacedAt } = session;
  const same = [{ idHash }, { replacedAt: within(issuedAt) }, ...(replacedAt ? [{ issuedAt: within(replacedAt) }] : [])];
  await Session.destroy({ where: { userId, [Op.or]: same } });
}

/** A change of id writes one moment into both rows. The database's moments are finer than ours. */
const within = (moment: Date) => ({ [Op.gte]: moment, [Op.lt]: new Date(moment.getTime() + 1) });

/** A new id for a session that has had its own for a day. The old one holds a minute more; of two askers one renews. */
export async function renewSession({ session }: Reader): Promise<string | undefined> {
  const id = freshId();
  const renewed = await inTransaction(async (transaction) => {
    const { idHash } = session;
    const old = await Session.findOne({ where: { idHash, replacedAt: null }, lock: transaction.LOCK.UPDATE, transaction });
    if (!old) return false;
    // Ids replaced before this one was given have long had their minute.
    await Session.destroy({ where: { userId: old.userId, replacedAt: { [Op.lt]: old.issuedAt } }, transaction });
    await old.update({ replacedAt: fn("now") as unknown as Date }, { fields: ["replacedAt"], transaction }); // the database's time
    const { userId, keep, device, beganAt } = old;
    const fields: ("idHash" | "userId" | "keep" | "device" | "beganAt")[] = ["idHash", "userId", "keep", "device", "beganAt"];
    await Session.create({ idHash: hashOf(id), userId, keep, device, beganAt }, { fields, transaction });
    return true;
  });
  return renewed ? sealId(id) : undefined;
}
