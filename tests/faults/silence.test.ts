import { connect, createServer, type Socket } from "node:net";
import { afterAll, beforeAll, expect, it } from "vitest";
import { GET } from "../../app/api/projects/[projectId]/route";
import { buildStage, type Stage } from "../api/actors";
import { ask } from "../build";

/** Passes bytes on to the database and back, until it is told to swallow them. */
const line = { silent: false, sockets: [] as Socket[] };
const relay = createServer((near) => {
  const { hostname, port } = new URL(database);
  const far = connect(Number(port), hostname);
  for (const [from, to] of [[near, far], [far, near]] as const) {
    line.sockets.push(from);
    from.on("data", (piece) => void (line.silent || to.write(piece))).on("close", () => to.destroy()).on("error", () => {});
  }
});
const database = process.env.DATABASE_URL!;

let stage: Stage;
beforeAll(async () => {
  await new Promise<void>((resolve) => relay.listen(0, "127.0.0.1", resolve));
  const address = new URL(database);
  address.host = `127.0.0.1:${(relay.address() as { port: number }).port}`;
  process.env.DATABASE_URL = address.href;
  stage = await buildStage();
});
afterAll(() => {
  line.sockets.forEach((socket) => socket.destroy());
  relay.close();
});

const open = () => ask(GET, { cookie: stage.cookies.owner, params: { projectId: stage.project.id } });

it("a line that swallows everything: 503 in words within 7 s, and back to service when the line is", async () => {
  expect((await open()).status).toBe(200);
  line.silent = true;
  const from = performance.now();
  const answers = await Promise.all([open(), open(), open()]);
  expect(answers.map(({ status }) => status)).toEqual([503, 503, 503]);
  expect(performance.now() - from).toBeLessThan(7_000);
  line.silent = false;
  // What was swallowed never comes: those connections have to go.
  const statuses = [];
  for (let tries = 0; tries < 4; tries += 1) statuses.push((await open()).status);
  expect(statuses.at(-1)).toBe(200);
});
