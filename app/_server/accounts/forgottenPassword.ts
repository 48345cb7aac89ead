import "server-only";
import { z } from "zod";
import { User } from "@/models";
import { answer } from "../answer";
import { writeJob, type Claimed } from "../jobs/queue";
import { readBody, requireSameOrigin } from "../request";
import { read } from "../sessionRoutes";
import { inTransaction } from "../transactions";
import { accepted } from "./accepted";
import { emailField } from "./fields";
import { writeLinkedLetter } from "./mailTokens";
import { countTry, networkOf } from "./throttles";

const form = z.strictObject({ email: emailField });

/** Asks for a link to a new password. Whether there is such an account is looked up after the answer. */
export function forgottenPasswordRoute(request: Request): Promise<Response> {
  return answer(async () => {
    requireSameOrigin(request);
    const { email } = read(form, await readBody(request));
    await countTry([
      { rule: "forgotten password of an account", subject: email },
      { rule: "forgotten password from an address", subject: networkOf(request) },
    ]);
    await inTransaction((transaction) => writeJob({ kind: "forgotten password", payload: { email } }, transaction));
    return accepted();
  });
}

/** Writes the letter where there is an account; done twice, the later link ends the earlier. */
export async function findForgetful({ payload }: Claimed): Promise<void> {
  const { email } = form.parse(payload);
  await inTransaction(async (transaction) => {
    const user = await User.findOne({ where: { email }, lock: transaction.LOCK.UPDATE, transaction });
    if (!user) return;
    const letter = { purpose: "password", letter: "password", to: email, path: "/new-password" } as const;
    await writeLinkedLetter({ userId: user.id, ...letter }, transaction);
  });
}
