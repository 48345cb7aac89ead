import "server-only";

export const ROLES = ["owner", "acoustician", "client", "builder"] as const;
export type Role = (typeof ROLES)[number];

/** may: yes. refused: may see the thing, not do this (403). What is not written does not exist for that role (404). */
type Right = "may" | "refused";
type Row = Partial<Record<Role, Right>>;

const everyone: Row = { owner: "may", acoustician: "may", client: "may", builder: "may" };
const team: Row = { owner: "may", acoustician: "may", client: "refused", builder: "refused" };

/** Who may do what: one row per act. Asked in `openProject`, and for a yard that is not there yet in `openTeam`. */
export const acts = {
  "make project": team,
  "open project": everyone,
  "rename project": team,
  "copy project": team,
  "edit plan": team,
  "set limit": team,
} as const satisfies Record<string, Row>;
export type ActName = keyof typeof acts;

/** What nobody may do in a project that was archived, except to restore it. */
export const writes: ReadonlySet<ActName> = new Set<ActName>(["edit plan", "set limit"]);

/**
 * The right of somebody with these roles, and the role it comes from: of several hats the first that may. No role, no
 * thing.
 */
export function rightOf(roles: readonly Role[], act: ActName): { right: Right; role: Role } | undefined {
  const row: Row = acts[act];
  const rights = roles.flatMap((role) => (row[role] ? [{ role, right: row[role] }] : []));
  return rights.find(({ right }) => right === "may") ?? rights[0];
}
