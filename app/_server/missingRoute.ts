import "server-only";
import { answer } from "./answer";
import { notFound } from "./errors";
import { requireSameOrigin } from "./request";

/** An address of the interface that is none, in the words of all others; what would change something is held to its origin first. */
export function missingRoute(request: Request): Promise<Response> {
  return answer(async () => {
    if (request.method !== "GET") requireSameOrigin(request);
    throw notFound();
  });
}
