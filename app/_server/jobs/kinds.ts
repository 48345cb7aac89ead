import "server-only";
import { findForgetful } from "../accounts/forgottenPassword";
import { sendLetter } from "../mail/sendLetter";
import type { Claimed } from "./queue";

/** What is done for each kind of job. Each may be run twice: a process can end between the work and its record. */
export const jobKinds: Record<string, ((job: Claimed) => Promise<void>) | undefined> = {
  "letter": sendLetter,
  "forgotten password": findForgetful,
};
