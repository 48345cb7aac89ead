import "server-only";
import { randomUUID } from "node:crypto";
import { readSeal, setCookie } from "./cookies";
import { answerError, Refusal } from "./errors";
import { log } from "./log";
import { identify, renewSession, type Reader } from "./identity";
import { countRequest } from "./rates";

/** Answers a request, or says in words why not; every answer is for its asker alone. */
export async function answer(work: () => Promise<Response>): Promise<Response> {
  try {
    return await work();
  } catch (thrown) {
    return answerError(thrown, randomUUID());
  }
}

/** JSON that no cache keeps. */
export function jsonAnswer(body: object, headers: Record<string, string> = {}): Response {
  return Response.json(body, { headers: { "Cache-Control": "private, no-store", ...headers } });
}

export function emptyAnswer(headers: Record<string, string> = {}): Response {
  return new Response(null, { status: 204, headers: { "Cache-Control": "private, no-store", ...headers } });
}

/** Who asks; nobody is refused, and so is who asks too often. */
export async function requireReader(request: Request): Promise<Reader> {
  const reader = await identify(readSeal(request));
  if (!reader) throw new Refusal("signed out", "You are signed out. Sign in again; what you typed stays here.");
  await countRequest(reader.session.idHash, request.method);
  return reader;
}

/** The answer with a new session id, where the old one has had its day. What was done is answered even if that fails. */
export async function renewed(response: Response, reader: Reader): Promise<Response> {
  const seal = reader.session.toRenew ? await renewSession(reader).catch(tell) : undefined;
  if (seal) response.headers.append("Set-Cookie", setCookie(seal, reader.session.keep));
  return response;
}

function tell(thrown: unknown): undefined {
  log.warn({ err: thrown }, "a session keeps its old id");
}
