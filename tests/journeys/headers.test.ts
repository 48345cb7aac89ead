import { readdirSync } from "node:fs";
import { describe, expect, it } from "vitest";

const address = process.env.STILLYARD_URL!;

const everywhere = {
  "x-content-type-options": "nosniff",
  "referrer-policy": "same-origin",
  "cross-origin-opener-policy": "same-origin",
  "cross-origin-resource-policy": "same-origin",
  "permissions-policy": "camera=(self), microphone=(), geolocation=()",
  "strict-transport-security": "max-age=63072000; includeSubDomains",
};

const pages = [
  "/", "/sign-in", "/sign-up", "/check-mail", "/forgotten-password", "/new-password?token=x", "/email-check?token=x", "/email-move?token=x", "/email-undo?token=x", "/local-inbox",
  "/account", "/projects", "/projects/new", "/nothing-here", "/projects/not-a-project",
  ...["", "/yard", "/rooms", "/sources", "/walls", "/walls/not-a-wall", "/limits"].map((stage) => `/projects/00000000-0000-4000-8000-000000000000${stage}`),
];
const answers = ["/api/health", "/api/nothing-here", ...routes()];
const methods = ["GET", "POST", "PATCH", "DELETE"];

/** Every route file's address, with a made-up name wherever one is asked for. */
function routes(): string[] {
  const files = readdirSync("app/api", { recursive: true, encoding: "utf8" }).filter((file) => /(^|\/)route\.ts$/.test(file));
  return files.map((file) => `/api/${file.replace(/\/?route\.ts$/, "").replace(/\[[^\]]+\]/g, "made-up")}`).sort();
}

async function fetchHeaders(path: string, method = "GET") {
  const answer = await fetch(address + path, { redirect: "manual", method });
  await answer.arrayBuffer();
  return Object.fromEntries(answer.headers);
}

describe("headers of the served product", () => {
  it.each([...pages, ...answers])("%s carries every one, and does not say what it is built with", async (path) => {
    const headers = await fetchHeaders(path);
    expect(headers).toMatchObject(everywhere);
    expect(headers["x-powered-by"]).toBeUndefined();
  });

  it.each(pages)("the page %s runs only scripts with its own fresh nonce", async (path) => {
    const [first, second] = [await fetchHeaders(path), await fetchHeaders(path)].map((headers) => headers["content-security-policy"]);
    expect(first).toMatch(/^default-src 'none'; script-src 'self' 'nonce-[A-Za-z0-9+/]{22}==' 'strict-dynamic'; /);
    expect(first).not.toContain("unsafe");
    expect(first).not.toBe(second);
  });

  it.each(answers)("the answer %s may run nothing and be kept nowhere", async (path) => {
    const headers = await fetchHeaders(path);
    expect(headers["content-security-policy"]).toBe("default-src 'none'; frame-ancestors 'none'");
    expect(headers["cache-control"]).toContain("no-store");
  });

  it.each(answers)("%s refuses whoever comes from elsewhere, by any method, with every header", async (path) => {
    for (const method of methods) {
      const headers = await fetchHeaders(path, method);
      expect([method, headers]).toMatchObject([method, everywhere]);
      expect([method, headers["cache-control"]]).toEqual([method, expect.stringContaining("no-store")]);
      expect([method, headers["content-security-policy"]]).toEqual([method, "default-src 'none'; frame-ancestors 'none'"]);
    }
  });

  it("every script of a page carries the nonce of its policy", async () => {
    const answer = await fetch(`${address}/sign-in`);
    const nonce = /'nonce-([^']+)'/.exec(answer.headers.get("content-security-policy") ?? "")?.[1];
    const scripts = (await answer.text()).match(/<script\b[^>]*>/g) ?? [];
    expect(scripts.length).toBeGreaterThan(0);
    for (const script of scripts) expect(script).toContain(`nonce="${nonce}"`);
  });

  it("an address of 3 kB is refused", async () => {
    expect((await fetch(`${address}/${"a".repeat(3_000)}`)).status).toBe(414);
  });
});
