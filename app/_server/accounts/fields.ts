import "server-only";
import { z } from "zod";

/** How an account's fields are read. An e-mail address is kept in small letters. */
export const emailField = z
  .string()
  .max(320)
  .transform((text) => text.trim().toLowerCase())
  .pipe(z.email("This is no e-mail address.").max(254, "At most 254 characters."));

export const nameField = z
  .string()
  .transform((text) => text.trim())
  .pipe(z.string().min(1, "Say what we may call you.").max(120, "At most 120 characters.").regex(/^[^\p{Cc}]*$/u, "One line of text."));

/** Its rules are said in words of their own; here only what nobody would type. */
export const passwordField = z.string().max(1_000);

/** A token out of a link of ours; whatever else is sent was never made. */
export const tokenField = z.string().max(2_000);
