import { Job } from "../models/index";
import { runNextJob } from "../app/_server/jobs/loop";
import { openMailServer, type MailServer, type Received } from "./mailServer";


/** A mail server that the file's environment names, opened before the environment is read. */
export async function openPost(): Promise<MailServer> {
  const server = await openMailServer();
  process.env.STILLYARD_SMTP = server.url;
  return server;
}

/** Does every job that is due. */
export async function doJobs(): Promise<void> {
  while (await runNextJob());
}

/** What came to an address since it was asked last, after every job that is due is done. */
export async function mailsTo({ received }: MailServer, email: string): Promise<Received[]> {
  await doJobs();
  const mine = received.filter(({ to }) => to === email);
  for (const mail of mine) received.splice(received.indexOf(mail), 1);
  return mine;
}

/** The token of the one link in a mail. */
export function tokenIn({ text }: Received): string {
  const link = /https?:\/\/\S+/.exec(text)?.[0];
  const token = link && new URL(link).searchParams.get("token");
  if (!token) throw new Error("There is no token in this mail.");
  return token;
}

export const waitingJobs = () => Job.count({ where: { state: "waiting" } });
