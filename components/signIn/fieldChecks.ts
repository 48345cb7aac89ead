import { countWords } from "../format";

/** Bounds of a new password, in characters; the server has the last word. */
const LEAST = 15;
const MOST = 128;

export const passwordHint = `At least ${LEAST} characters; spaces count, no rules about signs. Four words of your own will do.`;

export function newPasswordFault(password: string): string | undefined {
  const length = [...password].length;
  if (length === 0) return "Choose a password.";
  if (length < LEAST) return `${countWords(length, "character")}. ${LEAST} are needed.`.replace(/^./, (letter) => letter.toUpperCase());
  return length > MOST ? `${length} characters. ${MOST} is the most.` : undefined;
}

export function emailFault(email: string): string | undefined {
  if (email.trim() === "") return "Type your e-mail.";
  return /^[^\s@]+@[^\s@]+$/.test(email.trim()) ? undefined : "An e-mail has one @, with a name before it and a place behind it.";
}

export function nameFault(name: string): string | undefined {
  return name.trim() === "" ? "Type the name others here should see." : undefined;
}
