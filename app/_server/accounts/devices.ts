import "server-only";
import { fn, Op } from "sequelize";
import { Membership, Session } from "@/models";
import { answer, emptyAnswer, renewed, requireReader } from "../answer";
import { notFound } from "../errors";
import type { Reader } from "../identity";
import { isAlive } from "../lifetimes";
import { isIdentifier, requireSameOrigin } from "../request";
import { deviceWords } from "./deviceWords";

export interface Device {
  /** Names the session and opens nothing. */
  key: string;
  /** "Firefox on Linux" */
  device: string;
  beganAt: Date;
  seenAt: Date;
  /** The one that asks. */
  current: boolean;
}

/** Where the reader is signed in: this device first, then the one seen last. */
export async function listDevices(reader: Reader): Promise<Device[]> {
  const member = (await Membership.count({ where: { userId: reader.id } })) > 0;
  const attributes = { include: [[fn("now"), "now"] as [ReturnType<typeof fn>, string]] };
  const rows = await Session.findAll({ where: { userId: reader.id, replacedAt: null }, attributes, order: [["seenAt", "DESC"]] });
  const alive = rows.filter((row) => isAlive(row, member, row.get("now") as unknown as Date)); // asked for beside the columns
  const devices = alive.map(({ handle, device, beganAt, seenAt }) => ({
    key: handle,
    device: deviceWords(device),
    beganAt,
    seenAt,
    current: handle === reader.session.handle,
  }));
  return devices.toSorted((one, other) => Number(other.current) - Number(one.current));
}

/** Ends one of the reader's own sessions; of any other there is none. */
export function endDeviceRoute(request: Request, { params }: { params: Promise<{ key: string }> }): Promise<Response> {
  return answer(async () => {
    requireSameOrigin(request);
    const reader = await requireReader(request);
    const { key } = await params;
    const ended = isIdentifier(key) ? await Session.destroy({ where: { userId: reader.id, handle: key } }) : 0;
    if (ended === 0) throw notFound();
    return emptyAnswer();
  });
}

/** Ends all of the reader's sessions but the one that asks. */
export function endOtherDevicesRoute(request: Request): Promise<Response> {
  return answer(async () => {
    requireSameOrigin(request);
    const reader = await requireReader(request);
    await Session.destroy({ where: { userId: reader.id, handle: { [Op.ne]: reader.session.handle } } });
    return renewed(emptyAnswer(), reader);
  });
}
