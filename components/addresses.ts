/** Every address of the product, glued once. */
export const projectsAddress = "/projects";
export const budgetAddress = (projectId: string) => `/projects/${projectId}`;
export const wallsAddress = (projectId: string) => `${budgetAddress(projectId)}/walls`;
export const yardAddress = (projectId: string) => `${budgetAddress(projectId)}/yard`;
export const roomsAddress = (projectId: string) => `${budgetAddress(projectId)}/rooms`;
export const sourcesAddress = (projectId: string) => `${budgetAddress(projectId)}/sources`;
export const limitsAddress = (projectId: string) => `${budgetAddress(projectId)}/limits`;
export const elementAddress = (projectId: string, elementId: string) => `${wallsAddress(projectId)}/${elementId}`;

export const landingAddress = "/";
export const signUpAddress = "/sign-up";
export const checkMailAddress = "/check-mail";
export const forgottenAddress = "/forgotten-password";
export const accountAddress = "/account";
export const newProjectAddress = "/projects/new";

/** The sign-in page; `next` is where the reader wanted to go. */
export function signInAddress(next?: string): string {
  return next ? `/sign-in?${new URLSearchParams({ next })}` : "/sign-in";
}

/** A way back that stays in the product: a path of ours, or the list of yards. */
export function ownAddress(next: string | undefined): string {
  const ours = next !== undefined && /^\/(?![/\\])[\w\-./~%?=&]*$/.test(next) && !next.startsWith("/api/");
  return ours ? next : projectsAddress;
}

export const sessionRoute = "/api/session";
export const meRoute = "/api/me";
export const signUpRoute = "/api/sign-up";
export const emailCheckRoute = "/api/email-check";
export const forgottenRoute = "/api/forgotten-password";
export const newPasswordRoute = "/api/new-password";
export const passwordRoute = "/api/password";
export const proofRoute = "/api/proof";
export const emailRoute = "/api/email";
export const emailMoveRoute = "/api/email-move";
export const emailUndoRoute = "/api/email-undo";
export const sessionsRoute = "/api/sessions";
export const deviceRoute = (key: string) => `${sessionsRoute}/${encodeURIComponent(key)}`;
export const projectRouteAddress = (projectId: string) => `/api/projects/${projectId}`;
export const verdictRoute = (projectId: string, receiverId: string) =>
  `${projectRouteAddress(projectId)}/verdict/${receiverId}`;

export const changesRoute = (projectId: string) => `${projectRouteAddress(projectId)}/changes`;
export const projectsRoute = "/api/projects";

/** A kind of part, or one part of it: "elements", "receivers" ... */
export function partRoute(projectId: string, part: string, id?: string): string {
  return [projectRouteAddress(projectId), part, ...(id ? [id] : [])].join("/");
}
