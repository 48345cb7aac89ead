import "server-only";
import { createHash, randomBytes } from "node:crypto";
import { KnownBrowser } from "@/models";
import { sealId, unsealId } from "../cookies";
import { databaseNow } from "../moments";

const hashOf = (id: string) => createHash("sha256").update(id).digest("hex");

/** The browser's name where this person signed in with it before. For nobody the same is asked. */
export async function browserOf(seal: string | undefined, userId = "00000000-0000-4000-8000-000000000000"): Promise<string | undefined> {
  const id = await unsealId(seal);
  const row = id && (await KnownBrowser.findOne({ where: { idHash: hashOf(id), userId } }));
  return row ? row.idHash : undefined;
}

/** Knows a browser from now on; one that is known keeps its id. */
export async function rememberBrowser(seal: string | undefined, userId: string): Promise<string> {
  const id = (await unsealId(seal)) ?? randomBytes(32).toString("base64url");
  const row = { idHash: hashOf(id), userId, seenAt: databaseNow() };
  await KnownBrowser.bulkCreate([row], { fields: ["idHash", "userId", "seenAt"], updateOnDuplicate: ["seenAt"] });
  return sealId(id);
}
