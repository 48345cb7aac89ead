import "server-only";
import type { Transaction, WhereAttributeHashValue } from "sequelize";
import { Membership, Team, User } from "@/models";

type Which = { email: string } | { createdAt: WhereAttributeHashValue<Date> };

/** Takes away accounts whose address was never shown to be theirs, with the team nobody ever saw. */
export async function removeUnchecked(which: Which, transaction: Transaction): Promise<void> {
  const where = { ...("email" in which ? { email: which.email } : { createdAt: which.createdAt }), emailCheckedAt: null };
  const gone = await User.findAll({ where, limit: 100, lock: transaction.LOCK.UPDATE, transaction });
  const userId = gone.map(({ id }) => id);
  const memberships = await Membership.findAll({ where: { userId }, transaction });
  await User.destroy({ where: { id: userId }, transaction });
  await Team.destroy({ where: { id: memberships.map(({ teamId }) => teamId) }, transaction });
}
