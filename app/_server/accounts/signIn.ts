import "server-only";
import { User } from "@/models";
import { Refusal } from "../errors";
import { openSession, signOut } from "../identity";
import { hashPassword, isCheaper, matchesPassword } from "../passwords";
import { inTransaction } from "../transactions";
import { browserOf, rememberBrowser } from "./browsers";
import { writeLinkedLetter } from "./mailTokens";
import { countTry, forget, takeBack, type Counted } from "./throttles";

export interface Credentials {
  email: string;
  password: string;
  keep: boolean;
  device: string;
  /** Where the request comes from. */
  network: string;
}

interface Seals {
  /** Of the session that this browser has, which ends. */
  old?: string;
  /** Of the browser itself, where somebody signed in with it before. */
  browser?: string;
}

/** Sealed ids of a new session and of the browser. An unknown address and a wrong password take the same work and words. */
export async function signIn(credentials: Credentials, seals: Seals): Promise<{ seal: string; browserSeal: string }> {
  const { password, keep, device } = credentials;
  const email = credentials.email.trim().toLowerCase();
  const user = await User.findOne({ where: { email } });
  const counted = await counters({ email, userId: user?.id, network: credentials.network, browserSeal: seals.browser });
  await countTry(counted);
  const fits = await matchesPassword(password, user?.passwordHash).catch(async (thrown: unknown) => {
    await takeBack(counted);
    throw thrown;
  });
  if (!fits || !user) throw new Refusal("signed out", "E-mail and password do not fit together.");
  await settle(counted);
  if (!user.emailCheckedAt) return refuseUnchecked(user);
  if (isCheaper(user.passwordHash)) await user.update({ passwordHash: await hashPassword(password) }, { fields: ["passwordHash"] });
  await signOut(seals.old);
  return {
    seal: await inTransaction((transaction) => openSession({ userId: user.id, keep, device }, transaction)),
    browserSeal: await rememberBrowser(seals.browser, user.id),
  };
}

/** A browser that signed in to the account before has a count of its own: strangers cannot lock it out. */
async function counters(given: { email: string; userId?: string; network: string; browserSeal?: string }): Promise<Counted[]> {
  const { email, userId, network, browserSeal } = given;
  const browser = await browserOf(browserSeal, userId);
  if (browser) return [{ rule: "sign-in from a known browser", subject: `${browser} ${email}` }];
  return [
    { rule: "sign-in of an account", subject: email },
    { rule: "sign-in from an address", subject: network },
  ];
}

/** The right password: the account's count begins anew, the address's goes on without this try. */
async function settle(counted: readonly Counted[]) {
  const isOfAddress = ({ rule }: Counted) => rule === "sign-in from an address";
  await forget(counted.filter((one) => !isOfAddress(one)));
  await takeBack(counted.filter(isOfAddress));
}

/** Said only to who knows the password. The letter goes out again, at most every five minutes. */
async function refuseUnchecked({ id, email }: User): Promise<never> {
  const again = await countTry([{ rule: "letter to check an address", subject: email }]).then(
    () => true,
    () => false,
  );
  const letter = { userId: id, purpose: "check", letter: "check", to: email, path: "/email-check" } as const;
  if (again) await inTransaction((transaction) => writeLinkedLetter(letter, transaction));
  throw new Refusal("unchecked", "Look in your mail first: open the link there to say that this address is yours.");
}
