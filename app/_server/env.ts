import "server-only";
import { z } from "zod";

const secret = z
  .string()
  .regex(/^[\w-]+$/, "must be base64url")
  .refine((text) => Buffer.from(text, "base64url").length >= 32, "must hold at least 32 bytes");

const environment = z.object({
  DATABASE_URL: z.string().regex(/^postgres(ql)?:\/\//, "must be a postgres:// address"),
  STILLYARD_ORIGIN: z.url(),
  STILLYARD_PEPPER: secret,
  STILLYARD_SESSION_KEYS: z.string().transform((text) => text.split(",")).pipe(z.array(secret).min(1)),
  STILLYARD_SMTP: z.string().regex(/^smtps?:\/\//, "must be an smtp:// or smtps:// address").optional(),
  STILLYARD_MAIL_FROM: z.string().regex(/^[^\r\n]*@[^\r\n]*$/, "must hold an e-mail address").optional(),
  STILLYARD_REQUESTS_A_MINUTE: z.coerce.number().int().min(1).default(300),
  STILLYARD_WRITES_IN_10_S: z.coerce.number().int().min(1).default(20),
});

export interface Env {
  origin: URL;
  pepper: Buffer;
  /** Seal keys of sessions, newest first. */
  sessionKeys: string[];
  /** Whether browsers hold the address for secure: https, or this very machine. */
  trustworthy: boolean;
  /** The server that takes our mail, and who it is from; without a server mail waits. */
  smtp: string | undefined;
  mailFrom: string;
  /** How much one session may ask. */
  requestsAMinute: number;
  writesIn10s: number;
}

let checked: Env | undefined;

/** The environment, checked at first use: a build imports routes without one. */
export function env(): Env {
  return (checked ??= readEnvironment());
}

function readEnvironment(): Env {
  const read = environment.safeParse(process.env);
  if (!read.success) {
    const faults = read.error.issues.map(({ path, message }) => `${path.join(".")}: ${message}`);
    throw new Error(`The environment is not complete. ${faults.join("; ")}`);
  }
  const origin = new URL(read.data.STILLYARD_ORIGIN);
  return {
    origin,
    pepper: Buffer.from(read.data.STILLYARD_PEPPER, "base64url"),
    sessionKeys: read.data.STILLYARD_SESSION_KEYS,
    trustworthy: origin.protocol === "https:" || /^(localhost|127(\.\d+){3}|\[::1\])$/.test(origin.hostname),
    smtp: read.data.STILLYARD_SMTP,
    mailFrom: read.data.STILLYARD_MAIL_FROM ?? `Stillyard <post@${origin.hostname}>`,
    requestsAMinute: read.data.STILLYARD_REQUESTS_A_MINUTE,
    writesIn10s: read.data.STILLYARD_WRITES_IN_10_S,
  };
}
