import "server-only";
import { z } from "zod";
import { linkOf, tokenHolds, tokenOf } from "../accounts/mailTokens";
import { env } from "../env";
import type { Claimed } from "../jobs/queue";
import { letters, type LetterName } from "./letters";
import { post } from "./post";

const names = Object.keys(letters) as [LetterName, ...LetterName[]];
const letter = z.object({
  letter: z.enum(names),
  to: z.string(),
  /** The page its link opens; with a token that is made anew from the job's own id. */
  path: z.string().regex(/^\/[a-z-]+$/),
  token: z.boolean(),
});
export type LetterPayload = z.infer<typeof letter>;

/** Sends the letter of a job. Each try sends the very same one; a link that has ended meanwhile is not sent. */
export async function sendLetter({ id, payload, madeAt }: Claimed): Promise<void> {
  const { letter: name, to, path, token } = letter.parse(payload);
  if (token && !(await tokenHolds(tokenOf(id)))) return;
  const link = linkOf(path, token ? tokenOf(id) : undefined);
  const messageId = `<${id}@${env().origin.hostname}>`;
  await post({ to, messageId, date: madeAt, ...letters[name]({ link }) });
}
