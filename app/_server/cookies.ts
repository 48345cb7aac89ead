import "server-only";
import { createHash } from "node:crypto";
import { sealData, unsealData } from "iron-session";
import { env } from "./env";

/** Days a browser keeps the cookie of somebody who stays signed in; the session's own row decides earlier. */
const KEPT_DAYS = 30;
/** The longest that browsers keep any cookie. */
const BROWSER_DAYS = 400;

/** `__Host-` holds the cookie to this very address, but browsers refuse it where the address is not secure. */
export function cookieName(): string {
  return env().trustworthy ? "__Host-stillyard" : "stillyard";
}

/** A key's name in the seal is made from the key, so that it stays the same when a newer one stands before it. */
const nameOfKey = (key: string) => parseInt(createHash("sha256").update(key).digest("hex").slice(0, 8), 16);
const named = (keys: readonly string[]) => Object.fromEntries(keys.map((key) => [nameOfKey(key), key]));

/** The session's id, sealed with the newest key. The seal has no end of its own: the server's clock may be wrong. */
export function sealId(id: string): Promise<string> {
  return sealData({ id }, { password: named(env().sessionKeys.slice(0, 1)), ttl: 0 });
}

/** The id in a sealed cookie, or undefined where none of our keys opens it. */
export async function unsealId(seal: string | undefined): Promise<string | undefined> {
  if (!seal || seal.length > 512) return undefined;
  try {
    const { id } = await unsealData<{ id?: unknown }>(seal, { password: named(env().sessionKeys), ttl: 0 });
    return typeof id === "string" && /^[\w-]{43}$/.test(id) ? id : undefined;
  } catch {
    return undefined; // altered beyond what the seal's reader expects
  }
}

/** The cookie by which a browser is known again after it signed in once; it opens nothing. */
export const browserCookieName = () => `${cookieName()}-browser`;

export const readSeal = (request: Request) => readCookie(request, cookieName());
export const readBrowserSeal = (request: Request) => readCookie(request, browserCookieName());

function readCookie(request: Request, name: string): string | undefined {
  const start = `${name}=`;
  const cookies = request.headers.get("cookie")?.split(";").map((cookie) => cookie.trim()) ?? [];
  return cookies.find((cookie) => cookie.startsWith(start))?.slice(start.length);
}

export function setCookie(seal: string, keep: boolean): string {
  return cookie(cookieName(), seal, keep ? KEPT_DAYS : undefined);
}

export const setBrowserCookie = (seal: string) => cookie(browserCookieName(), seal, BROWSER_DAYS);

export const clearCookie = () => cookie(cookieName(), "", 0);

/** Without days it goes with the browser's window; with none it goes at once. */
function cookie(name: string, value: string, days?: number): string {
  const secure = env().trustworthy ? "; Secure" : "";
  const kept = days === undefined ? "" : `; Max-Age=${days * 86_400}`;
  return `${name}=${value}; Path=/; HttpOnly; SameSite=Lax${secure}${kept}`;
}
