import "server-only";
import type { Transaction, WhereOptions } from "sequelize";
import { Membership, Team, User } from "@/models";

/** Takes away accounts whose address was never shown to be theirs, with the team nobody ever saw. */
export async function removeUnchecked(which: WhereOptions<User>, transaction: Transaction): Promise<void> {
  const gone = await User.findAll({ where: { ...which, emailCheckedAt: null }, limit: 100, lock: transaction.LOCK.UPDATE, transaction });
  const userId = gone.map(({ id }) => id);
  const memberships = await Membership.findAll({ where: { userId }, transaction });
  await User.destroy({ where: { id: userId }, transaction });
  await Team.destroy({ where: { id: memberships.map(({ teamId }) => teamId) }, transaction });
}
