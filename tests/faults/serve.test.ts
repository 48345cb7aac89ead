import { type ChildProcess, fork } from "node:child_process";
import { once } from "node:events";
import { connect } from "node:net";
import { request as send, type IncomingHttpHeaders, Agent } from "node:http";
import { afterEach, describe, expect, it } from "vitest";

type Answer = { status: number; headers: IncomingHttpHeaders; text: string };

const everywhere = {
  "x-content-type-options": "nosniff",
  "referrer-policy": "same-origin",
  "cross-origin-opener-policy": "same-origin",
  "cross-origin-resource-policy": "same-origin",
  "permissions-policy": "camera=(self), microphone=(), geolocation=()",
  "strict-transport-security": "max-age=63072000; includeSubDomains",
};

const children: ChildProcess[] = [];

afterEach(() => children.splice(0).forEach((child) => child.kill("SIGKILL")));

async function openEcho(environment: Record<string, string> = {}) {
  const child = fork("tests/faults/echo.mjs", { env: { ...process.env, ...environment }, silent: true });
  children.push(child);
  const [{ port }] = (await once(child, "message")) as [{ port: number }];
  return { child, port };
}

function ask(port: number, path: string, headers: Record<string, string> = {}, agent?: Agent, method = "GET"): Promise<Answer> {
  return new Promise((resolve, reject) => {
    const asked = send({ host: "127.0.0.1", port, path, headers, agent, method }, async (response) => {
      let text = "";
      for await (const piece of response) text += piece;
      resolve({ status: response.statusCode ?? 0, headers: response.headers, text });
    });
    asked.on("error", reject);
    asked.end();
  });
}

function isAlive(pid: number): boolean {
  try {
    return process.kill(pid, 0);
  } catch {
    return false;
  }
}

describe("sizes and times", () => {
  it("an address of 3 kB is refused in words, one of 2 kB is not", async () => {
    const { port } = await openEcho();
    const long = await ask(port, `/${"a".repeat(3_000)}`);
    expect(long.status).toBe(414);
    expect(long.text).toContain("address is too long");
    expect((await ask(port, `/${"a".repeat(2_000)}`)).status).toBe(200);
  });

  it("headers of 20 kB are refused in words, those of 15 kB are not", async () => {
    const { port } = await openEcho();
    const large = await ask(port, "/", { "x-large": "a".repeat(20_000) });
    expect(large.status).toBe(431);
    expect(large.text).toContain("headers");
    expect((await ask(port, "/", { "x-large": "a".repeat(15_000) })).status).toBe(200);
  });

  it("an answer that does not come in time is a 503, and the server goes on", async () => {
    const { port } = await openEcho({ ANSWER_WITHIN: "300" });
    expect((await ask(port, "/never")).status).toBe(503);
    expect((await ask(port, "/")).status).toBe(200);
  });

  it("a fault of the handler is a 500 without its words, and the server goes on", async () => {
    const { port } = await openEcho();
    const answer = await ask(port, "/fault");
    expect(answer.status).toBe(500);
    expect(answer.text).not.toContain("a fault of the handler");
    expect((await ask(port, "/")).status).toBe(200);
  });
});

/** What comes back on a bare socket until the server ends it; what is sent after that finds nobody. */
function converse(port: number, text: string): Promise<string> {
  return new Promise((resolve, reject) => {
    let heard = "";
    const socket = connect({ host: "127.0.0.1", port, allowHalfOpen: true }, () => socket.write(text));
    socket.on("data", (piece) => (heard += piece));
    // Our own half stays open and speaks on until there is nobody left to hear it.
    const speaking = setInterval(() => socket.write("."), 200);
    socket.on("error", ({ code }: NodeJS.ErrnoException) => (code === "ECONNRESET" || code === "EPIPE" ? resolve(heard) : reject(new Error(code))));
    socket.on("close", () => clearInterval(speaking));
  });
}

describe("requests that nobody behind has to read", () => {
  it.each([["/%E0%A4%A"], ["/%"], ["http://elsewhere.example/projects"], ["*"]])("the address %s is a 400 in words", async (path) => {
    const { port } = await openEcho();
    const answer = await ask(port, path);
    expect([answer.status, answer.text]).toEqual([400, "This request could not be read.\n"]);
    expect(answer.headers).toMatchObject(everywhere);
  });

  it("a query may hold what is no text", async () => {
    const { port } = await openEcho();
    expect((await ask(port, "/?next=%E0%A4%A")).status).toBe(200);
  });

  it("a method that is none of ours is a 405", async () => {
    const { port } = await openEcho();
    expect((await ask(port, "/", {}, undefined, "TRACE")).status).toBe(405);
    expect((await ask(port, "/", {}, undefined, "PROPFIND")).status).toBe(405);
  });

  it("a socket that would become a channel is refused and closed, though the other side holds it open", async () => {
    const { port } = await openEcho();
    const heard = await converse(port, "GET / HTTP/1.1\r\nHost: localhost\r\nConnection: Upgrade\r\nUpgrade: websocket\r\n\r\n");
    expect(heard).toMatch(/^HTTP\/1\.1 400 /);
  });
});

describe("headers", () => {
  it("an answer that says nothing of its own may run nothing and is kept nowhere; one that does is left alone", async () => {
    const { port } = await openEcho();
    expect((await ask(port, "/")).headers).toMatchObject({
      "content-security-policy": "default-src 'none'; frame-ancestors 'none'",
      "cache-control": "private, no-store",
    });
    expect((await ask(port, "/own")).headers).toMatchObject({ "content-security-policy": "script-src 'self'", "cache-control": "public" });
  });

  it("every answer carries them: served, refused, and refused before it was read", async () => {
    const { port } = await openEcho({ ANSWER_WITHIN: "300" });
    const refused = [
      ask(port, `/${"a".repeat(3_000)}`),
      ask(port, "/", { "x-large": "a".repeat(20_000) }),
      ask(port, "/never"),
      ask(port, "/fault"),
    ];
    for (const answer of await Promise.all([ask(port, "/"), ...refused])) expect(answer.headers).toMatchObject(everywhere);
    for (const answer of await Promise.all(refused)) {
      expect(answer.headers["content-security-policy"]).toBe("default-src 'none'; frame-ancestors 'none'");
    }
  });

  it("an address that is neither https nor this machine is not told to insist on https", async () => {
    const { port } = await openEcho({ ORIGIN: "http://workshop.example:3000" });
    expect((await ask(port, "/")).headers["strict-transport-security"]).toBeUndefined();
  });
});

describe("the client's address", () => {
  const forged = {
    "X-Forwarded-For": "203.0.113.9",
    "X-Forwarded-Host": "forged.example",
    "X-Real-IP": "203.0.113.9",
    Forwarded: "for=203.0.113.9",
    "X-Stillyard-Address": "203.0.113.9",
    "X-Middleware-Subrequest": "proxy:proxy:proxy",
  };

  it("comes from the socket: nothing a client says about itself arrives", async () => {
    const { port } = await openEcho();
    const { text } = await ask(port, "/", forged);
    const { headers, raw } = JSON.parse(text);
    expect(headers["x-stillyard-address"]).toBe("127.0.0.1");
    expect(raw.filter((name: string) => name.toLowerCase() === "x-stillyard-address")).toHaveLength(1);
    expect(text).not.toMatch(/203\.0\.113\.9|forged\.example|subrequest/i);
  });

  it("is the last word of a hop we trust, and of no other", async () => {
    const chain = { "X-Forwarded-For": "203.0.113.9, 198.51.100.7" };
    const trusting = await openEcho({ TRUSTED_HOP: "127.0.0.1" });
    const other = await openEcho({ TRUSTED_HOP: "192.0.2.1" });
    expect(JSON.parse((await ask(trusting.port, "/", chain)).text).headers["x-stillyard-address"]).toBe("198.51.100.7");
    expect(JSON.parse((await ask(other.port, "/", chain)).text).headers["x-stillyard-address"]).toBe("127.0.0.1");
  });
});

describe("the end", () => {
  it("an open request is answered after SIGTERM, then the process is gone with exit code 0", async () => {
    const { child, port } = await openEcho();
    const agent = new Agent({ keepAlive: true });
    await ask(port, "/", {}, agent);
    const open = ask(port, "/slow", {}, agent);
    await new Promise((resolve) => setTimeout(resolve, 200));
    const exit = once(child, "exit");
    child.kill("SIGTERM");
    expect((await open).status).toBe(200);
    expect(await exit).toEqual([0, null]);
    expect(isAlive(child.pid!)).toBe(false);
    await expect(ask(port, "/")).rejects.toThrow("ECONNREFUSED");
    agent.destroy();
  });

  it("a repeated signal does not cut the open request off", async () => {
    const { child, port } = await openEcho();
    const open = ask(port, "/slow");
    await new Promise((resolve) => setTimeout(resolve, 200));
    const exit = once(child, "exit");
    child.kill("SIGINT");
    child.kill("SIGINT");
    expect((await open).status).toBe(200);
    expect(await exit).toEqual([0, null]);
  });
});
