export const dynamic = "force-dynamic";

/** Says that this process answers; it asks nobody else. */
export function GET(): Response {
  return Response.json({ up: true });
}
