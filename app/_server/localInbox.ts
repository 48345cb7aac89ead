import "server-only";

/** A mail that a run on this very machine kept instead of sending it. */
export interface LocalMail {
  id: string;
  to: string;
  subject: string;
  text: string;
  at: Date;
}

declare global {
  /** Filled by the mail server of such a run, in the same process; elsewhere there is none. */
  var stillyardInbox: LocalMail[] | undefined;
}

/** The mails of such a run, the newest first; undefined where mail is really sent. */
export const readLocalInbox = (): readonly LocalMail[] | undefined => globalThis.stillyardInbox;
