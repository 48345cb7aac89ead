import "server-only";

/** What was asked is taken on; what becomes of it is told by mail alone. */
export function accepted(): Response {
  return Response.json({}, { status: 202, headers: { "Cache-Control": "private, no-store" } });
}
