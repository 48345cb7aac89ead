import { request as send, type IncomingHttpHeaders } from "node:http";
import { beforeAll, describe, expect, it } from "vitest";
import people from "../../data/examples/people.json";
import { idOf } from "../../scripts/idOf";
import { address } from "../browser";

/** The framework's other ways to a page ask the same rights: data of a page, prefetches, headers that once passed by. */

const yard = idOf("project", "plumtree-row");
const nowhere = "00000000-0000-4000-8000-000000000000";

interface Heard {
  status: number;
  headers: IncomingHttpHeaders;
  text: string;
}

/** Asks as the framework's own pages do: it sends on whoever bears no mark of what was asked, to the same page with that mark. */
async function ask(path: string, headers: Record<string, string> = {}, method = "GET", body?: string): Promise<Heard> {
  const first = await askOnce(path, headers, method, body);
  const { location = "" } = first.headers;
  const same = first.status === 307 && location.includes("_rsc") && new URL(location, address).pathname === path.split("?")[0];
  if (!same) return first;
  const { pathname, search } = new URL(location, address);
  return askOnce(pathname + search, headers, method, body);
}

function askOnce(path: string, headers: Record<string, string> = {}, method = "GET", body?: string): Promise<Heard> {
  const { port } = new URL(address);
  return new Promise((resolve, reject) => {
    const asked = send({ host: "127.0.0.1", port, path, headers: { host: new URL(address).host, ...headers }, method }, async (response) => {
      let text = "";
      for await (const piece of response) text += piece;
      resolve({ status: response.statusCode ?? 0, headers: response.headers, text });
    });
    asked.on("error", reject);
    asked.end(body);
  });
}

async function signIn(key: string): Promise<string> {
  const { email, password } = people.find((person) => person.key === key)!;
  const headers = { "Sec-Fetch-Site": "same-origin", "Content-Type": "application/json" };
  const answer = await ask("/api/session", headers, "POST", JSON.stringify({ email, password }));
  expect(answer.status).toBe(200);
  return answer.headers["set-cookie"]![0]!.split(";")[0]!;
}

let cookie: string;
beforeAll(async () => {
  cookie = await signIn("ines");
});

const tree = (value: unknown) => encodeURIComponent(JSON.stringify(value));
const deep = tree(["", { children: ["projects", { children: [["projectId", yard, "d", null], { children: ["__PAGE__", {}] }] }] }, null, null, 16]);

const dresses: [string, (path: string) => { path: string; headers: Record<string, string> }][] = [
  ["as it is", (path) => ({ path, headers: {} })],
  ["with .rsc", (path) => ({ path: `${path}.rsc`, headers: {} })],
  ["with RSC: 1", (path) => ({ path, headers: { RSC: "1" } })],
  ["with RSC: 1 and its mark", (path) => ({ path: `${path}?_rsc=abc12`, headers: { RSC: "1" } })],
  ["with a state of its page", (path) => ({ path: `${path}?_rsc=abc12`, headers: { RSC: "1", "Next-Router-State-Tree": deep } })],
  ["as a prefetch", (path) => ({ path: `${path}?_rsc=abc12`, headers: { RSC: "1", "Next-Router-Prefetch": "1" } })],
  ["as a prefetch of a segment", (path) => ({ path: `${path}?_rsc=abc12`, headers: { RSC: "1", "Next-Router-Prefetch": "1", "Next-Router-Segment-Prefetch": "/_tree" } })],
  ["as a segment by address", (path) => ({ path: `${path}.segments/_tree.segment.rsc`, headers: { RSC: "1" } })],
  ["as a middleware's own", (path) => ({ path, headers: { "x-middleware-subrequest": "proxy:proxy:proxy:proxy:proxy" } })],
  ["as one that was rewritten", (path) => ({ path, headers: { "x-rewrite-url": `/projects/${yard}`, "x-original-url": `/projects/${yard}`, "x-invoke-path": `/projects/${yard}`, "x-matched-path": `/projects/${yard}` } })],
  ["as data of the older kind", (path) => ({ path: `/_next/data/development${path}.json`, headers: { "x-nextjs-data": "1" } })],
];

/** Words that only who may read the yard may read. */
const secret = /no9-bedroom|Bedroom|"verdict":|"revision":/;

const pages = [`/projects/${yard}`, `/projects/${yard}/walls`, `/projects/${yard}/walls/${idOf("plumtree-row", "yard-door")}`, "/projects"];

describe("a yard's pages", () => {
  it.each(dresses)("show nobody anything, asked %s", async (_, dress) => {
    for (const page of pages) {
      const { path, headers } = dress(page);
      const answer = await ask(path, headers);
      expect([page, answer.status < 500, secret.test(answer.text)]).toEqual([page, true, false]);
    }
  });

  it.each(dresses)("show who may not read them what was never there, asked %s", async (_, dress) => {
    for (const page of pages.filter((one) => one.includes(yard))) {
      const { path, headers } = dress(page.replace(yard, nowhere));
      const answer = await ask(path, { ...headers, cookie });
      expect([page, answer.status < 500, /"verdict":|"revision":/.test(answer.text)]).toEqual([page, true, false]);
    }
  });

  it.each([{}, { RSC: "1" }] as Record<string, string>[])("do show them to who may, as a page and as its data %#", async (headers) => {
    const answer = await ask(pages[0]!, { ...headers, cookie });
    expect([answer.status, secret.test(answer.text)]).toEqual([200, true]);
  });
});

describe("a yard's routes", () => {
  it.each(dresses.slice(2, 10))("refuse nobody with 401 and give nothing, asked %s", async (_, dress) => {
    const { path, headers } = dress(`/api/projects/${yard}`);
    const answer = await ask(path, headers);
    expect([answer.status < 500, secret.test(answer.text)]).toEqual([true, false]);
    if (!path.includes("segments")) expect(answer.status).toBe(401);
  });
});

describe("headers that cannot be read", () => {
  const odd = [
    "x", "%E0%A4%A", "[]", "{}", tree(null), tree([1, 2]), tree(["", { children: 1 }]), "%5B".repeat(300), tree(["", {}]), tree(["", { children: ["nowhere", {}] }]),
    tree([["projectId", "x", "d", null], {}]), tree(["", { children: [["projectId", yard, "oc", ["a"]], {}] }, ["/x", "/y"], "refetch"]),
    tree(["", { __proto__: ["x", {}], constructor: ["y", {}] }]),
    tree(Array.from({ length: 150 }).reduce<unknown>((inner) => ["a", { children: inner }], ["a", {}])),
  ];
  it.each(odd.map((state, place) => ({ place, state })))("of the state of a page are refused or left alone, never a fault: number $place", async ({ state }) => {
    for (const page of ["/", "/sign-in", pages[0]!]) {
      for (const more of [{}, { "Next-Router-Prefetch": "1" }, { "Next-Router-Segment-Prefetch": "/_tree" }] as Record<string, string>[]) {
        const answer = await ask(`${page}?_rsc=abc12`, { RSC: "1", "Next-Router-State-Tree": state, cookie, ...more });
        expect([page, answer.status < 500]).toEqual([page, true]);
      }
    }
  });

  it("of an action that is none are no fault", async () => {
    for (const action of ["x", "a".repeat(42), "0".repeat(40)]) {
      const answer = await ask("/sign-in", { "Next-Action": action, "Content-Type": "text/plain;charset=UTF-8", cookie }, "POST", "[]");
      expect(answer.status).toBeGreaterThanOrEqual(400);
      expect(answer.status).toBeLessThan(500);
    }
  });
});

describe("addresses of the interface that are none", () => {
  it.each([["GET", 404], ["POST", 404], ["DELETE", 404]])("%s is told so as JSON", async (method, status) => {
    const answer = await ask("/api/nothing/here", { "Sec-Fetch-Site": "same-origin" }, method);
    expect([answer.status, (JSON.parse(answer.text) as { error: { code: string } }).error.code]).toEqual([status, "missing"]);
    expect(answer.headers["cache-control"]).toBe("private, no-store");
  });
});
