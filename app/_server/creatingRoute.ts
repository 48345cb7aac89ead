import "server-only";
import type { Transaction } from "sequelize";
import { answer, renewed, requireReader } from "./answer";
import type { Reader } from "./identity";
import { once } from "./idempotency";
import { readBody, requireSameOrigin } from "./request";
import { inTransaction } from "./transactions";

interface Creating<P> {
  reader: Reader;
  params: P;
  body: Record<string, unknown>;
  transaction: Transaction;
}
type Route<P> = (request: Request, context: { params: Promise<P> }) => Promise<Response>;

/** A route that makes a yard. `create` gives the new id; the answer says it, and where to go from there. */
export function creatingRoute<P>(create: (given: Creating<P>) => Promise<string>, nextOf: (id: string) => string): Route<P> {
  return (request, context) =>
    answer(async () => {
      requireSameOrigin(request);
      const reader = await requireReader(request);
      const params = await context.params;
      const body = await readBody(request);
      const { id } = await inTransaction((transaction) =>
        once({ request, reader, body, transaction }, async () => ({ id: await create({ reader, params, body, transaction }) })),
      );
      const headers = { "Cache-Control": "private, no-store" };
      return renewed(Response.json({ id, next: nextOf(id) }, { status: 201, headers }), reader);
    });
}
