import "server-only";
import { z } from "zod";
import { User } from "@/models";
import { answer, jsonAnswer } from "../answer";
import { databaseNow } from "../moments";
import { readBody, requireSameOrigin } from "../request";
import { read } from "../sessionRoutes";
import { inTransaction } from "../transactions";
import { tokenField } from "./fields";
import { useToken } from "./mailTokens";

const form = z.strictObject({ token: tokenField });

/** Takes the word of a link for it that an address is somebody's. */
export function emailCheckRoute(request: Request): Promise<Response> {
  return answer(async () => {
    requireSameOrigin(request);
    const { token } = read(form, await readBody(request));
    await inTransaction(async (transaction) => {
      const { userId } = await useToken(token, "check", transaction);
      await User.update({ emailCheckedAt: databaseNow() }, { where: { id: userId }, fields: ["emailCheckedAt"], transaction });
    });
    return jsonAnswer({ next: "/sign-in" });
  });
}
