const KEY = "stillyard-mailed-to";

/** The e-mail that a link was just sent to, for the next page in this tab only; it never stands in an address. */
export function keepMailedTo(email: string): void {
  try {
    sessionStorage.setItem(KEY, email);
  } catch {
    // Without storage the page says the same without the e-mail.
  }
}

export function readMailedTo(): string | null {
  try {
    return sessionStorage.getItem(KEY);
  } catch {
    return null;
  }
}
