import "server-only";
import { createTransport } from "nodemailer";
import { env } from "../env";

/** Shorter together than the lease of a job. */
const times = { connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 20_000, dnsTimeout: 5_000 };

interface Mail {
  to: string;
  subject: string;
  text: string;
  messageId: string;
  date: Date;
}

/** Hands a mail to the server that takes ours; throws where it was not taken. */
export async function post({ to, ...mail }: Mail): Promise<void> {
  const { smtp, mailFrom } = env();
  if (!smtp) throw new Error("No mail server is named (STILLYARD_SMTP).");
  const transport = createTransport({ url: smtp, ...times, disableFileAccess: true, disableUrlAccess: true });
  try {
    const headers = { "Auto-Submitted": "auto-generated" };
    await transport.sendMail({ ...mail, from: mailFrom, to: { name: "", address: to }, headers });
  } finally {
    transport.close();
  }
}
