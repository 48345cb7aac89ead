import "server-only";
import { Op } from "sequelize";
import { Job, KnownBrowser, MailToken, Throttle } from "@/models";
import { removeUnchecked } from "../accounts/removeUnchecked";
import { inTransaction } from "../transactions";
import { fromNow } from "../moments";

const HOUR = 3_600;
const DAY = 24 * HOUR;
const before = (seconds: number) => ({ [Op.lt]: fromNow(-seconds) });

/** Takes away what has had its time. */
export async function sweep(): Promise<void> {
  await Throttle.destroy({ where: { lastAt: before(4 * HOUR) } });
  await Job.destroy({ where: { state: "done", endedAt: before(7 * DAY) } });
  await MailToken.destroy({ where: { expiresAt: before(30 * DAY) } });
  await KnownBrowser.destroy({ where: { seenAt: before(400 * DAY) } });
  await inTransaction((transaction) => removeUnchecked({ createdAt: before(7 * DAY) }, transaction));
}
