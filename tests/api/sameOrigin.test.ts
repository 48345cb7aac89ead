import { beforeAll, describe, expect, it } from "vitest";
import { ask } from "../build";
import { buildStage, type Stage } from "./actors";
import { findRoutes, type ServedRoute } from "./routes";

let stage: Stage;
let routes: ServedRoute[];
beforeAll(async () => {
  stage = await buildStage();
  routes = (await findRoutes()).filter(({ method, name }) => method !== "GET" && name !== "POST /api/csp");
});

const sayings: [string, Record<string, string>, boolean][] = [
  ["cross-site", { "sec-fetch-site": "cross-site" }, false],
  ["same-site", { "sec-fetch-site": "same-site" }, false],
  ["no site at all (typed address)", { "sec-fetch-site": "none" }, false],
  ["cross-site with our own Origin", { "sec-fetch-site": "cross-site", origin: "http://localhost:3000" }, false],
  ["neither header", { "sec-fetch-site": "" }, false],
  ["a null Origin", { "sec-fetch-site": "", origin: "null" }, false],
  ["another Origin", { "sec-fetch-site": "", origin: "http://localhost:3001" }, false],
  ["an Origin that only begins like ours", { "sec-fetch-site": "", origin: "http://localhost:3000.stillyard.example" }, false],
  ["same-origin", { "sec-fetch-site": "same-origin" }, true],
  ["our own Origin, from a browser without the newer header", { "sec-fetch-site": "", origin: "http://localhost:3000" }, true],
];

describe("a change can only be asked from our own pages", () => {
  it.each(sayings)("%s", async (_, headers, passes) => {
    expect(routes.length).toBeGreaterThan(6);
    for (const { name, method, handler } of routes) {
      const params = { projectId: stage.project.id, part: "fences", partId: stage.plan.fences[0]!.id };
      // No revision and a body that fits nothing: whoever passes the gate is refused by a later one, and nothing changes.
      const answer = await ask(handler, { method, cookie: stage.cookies.client, params, headers, body: method === "DELETE" ? undefined : {} });
      const body = answer.status === 204 ? "" : await answer.text();
      const stopped = answer.status === 403 && body.includes("our own pages");
      expect(stopped, name).toBe(!passes);
      if (name === "DELETE /api/session" && passes) break;
    }
  });

  it.each(sayings.filter(([, , passes]) => !passes))("a form of text is refused as well: %s", async (_, headers) => {
    for (const { name, method, handler } of routes) {
      const params = { projectId: stage.project.id, part: "fences", partId: stage.plan.fences[0]!.id };
      const form = { "content-type": "text/plain", ...headers };
      const answer = await ask(handler, { method, cookie: stage.cookies.owner, params, headers: form, body: method === "DELETE" ? undefined : "x=1" });
      expect(answer.status, name).toBe(403);
    }
  });

  it("a form of another page, sent as text, is refused twice over", async () => {
    const { handler } = routes.find(({ name }) => name.startsWith("POST /api/projects"))!;
    const params = { projectId: stage.project.id, part: "fences" };
    const form = { method: "POST", cookie: stage.cookies.owner, params, body: "{}" };
    expect((await ask(handler, { ...form, headers: { "content-type": "text/plain", "sec-fetch-site": "cross-site" } })).status).toBe(403);
    expect((await ask(handler, { ...form, headers: { "content-type": "text/plain" } })).status).toBe(415);
    expect((await ask(handler, { ...form, headers: { "content-type": "application/x-www-form-urlencoded" } })).status).toBe(415);
  });

  it("no answer carries a header that lets other pages read it", async () => {
    for (const { method, handler } of routes) {
      const answer = await ask(handler, { method, headers: { origin: "http://elsewhere.example" }, body: method === "DELETE" ? undefined : {} });
      expect([...answer.headers.keys()].filter((key) => key.startsWith("access-control"))).toEqual([]);
    }
  });
});
