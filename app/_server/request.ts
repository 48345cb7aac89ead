import "server-only";
import { env } from "./env";
import { Refusal } from "./errors";

const BODY_BYTES = 256 * 1024;
const DEPTH = 20;

/** Only our own pages change anything: browsers say where a request comes from, and whoever does not say is refused. */
export function requireSameOrigin(request: Request) {
  const site = request.headers.get("sec-fetch-site");
  const ours = site === null ? request.headers.get("origin") === env().origin.origin : site === "same-origin";
  if (!ours) throw new Refusal("refused", "This can only be asked from our own pages.");
}

/** The JSON object in a request's body, within its bounds. */
export async function readBody(request: Request): Promise<Record<string, unknown>> {
  const type = request.headers.get("content-type")?.split(";")[0]?.trim().toLowerCase();
  if (type !== "application/json") throw new Refusal("wrong type", "Only application/json is read here.");
  const body = parse(await readText(request, BODY_BYTES));
  if (typeof body !== "object" || body === null || Array.isArray(body)) throw unreadable();
  checkValues(body);
  return body as Record<string, unknown>; // an object of JSON
}

/** The text of a body, given up as soon as it is longer than `most` bytes. */
export async function readText(request: Request, most: number): Promise<string> {
  const tooLarge = new Refusal("too large", `At most ${Math.floor(most / 1024)} kB can be read here.`);
  if (Number(request.headers.get("content-length") ?? 0) > most) throw tooLarge;
  const chunks: Uint8Array[] = [];
  let bytes = 0;
  for await (const chunk of request.body ?? []) {
    bytes += chunk.byteLength;
    if (bytes > most) throw tooLarge;
    chunks.push(chunk);
  }
  return new TextDecoder().decode(Buffer.concat(chunks));
}

const unreadable = () => new Refusal("unreadable", "This could not be read.");

function parse(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    throw unreadable();
  }
}

/** No deeper than a plan ever is, and no text that could not be kept as it came. */
function checkValues(body: object) {
  const open: { value: unknown; depth: number }[] = [{ value: body, depth: 1 }];
  for (const { value, depth } of open) {
    if (typeof value === "string") checkText(value);
    if (typeof value !== "object" || value === null) continue;
    if (depth > DEPTH) throw unreadable();
    for (const [key, inner] of Object.entries(value)) {
      checkText(key);
      open.push({ value: inner, depth: depth + 1 });
    }
  }
}

/** PostgreSQL keeps neither a NUL nor half a character. */
function checkText(text: string) {
  if (/\0|\p{Surrogate}/u.test(text)) throw new Refusal("invalid", "A text holds a character that cannot be kept.");
}

/** The revision a change was made on, or undefined where the request names none. */
export function readRevision(request: Request): number | undefined {
  const text = request.headers.get("if-match");
  if (text === null) return undefined;
  const digits = /^(?:W\/)?"?(\d{1,9})"?$/.exec(text.trim())?.[1];
  if (digits === undefined) throw new Refusal("unreadable", "The revision in If-Match could not be read.");
  return Number(digits);
}

const identifier = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/;

/** Whether it can be the id of anything: what cannot is not looked for. */
export const isIdentifier = (text: string) => identifier.test(text);
