import { beforeAll, describe, expect, it } from "vitest";
import { PATCH, DELETE } from "../../app/api/projects/[projectId]/[part]/[partId]/route";
import { POST } from "../../app/api/projects/[projectId]/[part]/route";
import { POST as REPORT } from "../../app/api/csp/route";
import { GET } from "../../app/api/projects/[projectId]/route";
import type { Answer } from "../../app/_server/weigh";
import { ask } from "../build";
import { injectionStrings } from "../injections";
import { buildStage, type Stage } from "./actors";

let stage: Stage;
beforeAll(async () => {
  stage = await buildStage();
});

const door = () => ({ projectId: stage.project.id, part: "elements", partId: stage.idOf("yard-door") });

async function change(body: unknown, headers: Record<string, string> = {}, params = door()) {
  const { revision } = await stage.project.reload();
  return ask(PATCH, { method: "PATCH", cookie: stage.cookies.owner, params, revision, body, headers });
}

interface Refused {
  error: { code: string; message: string; fields?: Record<string, string>; requestId: string };
}

describe("bodies", () => {
  it.each([
    ["not JSON", "{", 400],
    ["nothing", "", 400],
    ["a list", "[]", 400],
    ["a bare number", "12", 400],
    ["null", "null", 400],
    ["deeper than 20", JSON.stringify({ params: Array.from({ length: 20 }).reduce((inner) => [inner], 1) }), 400],
    ["two hundred thousand brackets", "[".repeat(200_000), 400],
    ["a NUL in a text", JSON.stringify({ name: "door\0" }), 422],
    ["half a character", '{"name":"\\ud800"}', 422],
    ["a NUL in a field's name", JSON.stringify({ "na\0me": "door" }), 422],
    ["257 kB", JSON.stringify({ name: "x".repeat(257 * 1024) }), 413],
    ["a number beyond the range of numbers", '{"area":1e999}', 422],
    ["an id of one's own", JSON.stringify({ id: "00000000-0000-4000-8000-000000000000" }), 200],
    ["a project of one's own", JSON.stringify({ projectId: "00000000-0000-4000-8000-000000000000" }), 422],
    ["a prototype", '{"__proto__":{"area":3}}', 422],
  ])("%s", async (_, body, status) => {
    const answer = await change(body);
    const text = await answer.text();
    expect(answer.status).toBe(status);
    if (status === 200) return;
    const { error } = JSON.parse(text) as Refused;
    expect(error.message).toMatch(/^[A-Z].*\.$/);
    expect(error.requestId).toMatch(/^[0-9a-f-]{36}$/);
    expect(text).not.toMatch(/sequelize|select |insert |update |zod|at .*\.ts/i);
  });

  it("the part's own id stands whatever the body says", async () => {
    const answer = await ask(GET, { cookie: stage.cookies.owner, params: { projectId: stage.project.id } });
    const { plan } = (await answer.json()) as Answer;
    expect(plan.elements.map(({ id }) => id)).toEqual(stage.plan.elements.map(({ id }) => id));
  });

  it("a body longer than it says is given up on the way", async () => {
    const { revision } = await stage.project.reload();
    let sent = 0;
    const endless = new ReadableStream<Uint8Array>({
      pull: (controller) => {
        sent += 65_536;
        controller.enqueue(new Uint8Array(65_536).fill(32));
      },
    });
    const headers = { cookie: stage.cookies.owner, "sec-fetch-site": "same-origin", "content-type": "application/json", "if-match": `"${revision}"` };
    const request = new Request("http://localhost:3000/api", { method: "PATCH", headers, body: endless, duplex: "half" } as RequestInit);
    expect((await PATCH(request, { params: Promise.resolve(door()) })).status).toBe(413);
    expect(sent).toBeLessThan(1_000_000);
  });

  it("each wrong field is named, and nothing is kept of the patch", async () => {
    const before = await stage.project.reload();
    const answer = await change({ area: 0, name: "", limit: 500 });
    const { error } = (await answer.json()) as Refused;
    expect(answer.status).toBe(422);
    expect(Object.keys(error.fields!).sort()).toEqual(["area", "limit", "name"]);
    expect((await stage.project.reload()).revision).toBe(before.revision);
  });

  it("a field that is not known is refused wherever it stands, and the ones beside it are not kept", async () => {
    const before = await stage.project.reload();
    const answer = await change({ area: 2, params: { colour: "red" } });
    expect([answer.status, Object.keys(((await answer.json()) as Refused).error.fields!)]).toEqual([422, ["params.colour"]]);
    expect((await stage.project.reload()).revision).toBe(before.revision);
  });

  it("a report of the browser: 8 kB, no more, and no word back", async () => {
    const short = await ask(REPORT, { method: "POST", headers: { "content-type": "application/csp-report" }, body: "{}" });
    const long = await ask(REPORT, { method: "POST", headers: { "content-type": "application/csp-report" }, body: "x".repeat(8193) });
    expect([short.status, await short.text(), long.status]).toEqual([204, "", 413]);
  });
});

describe("texts that look like commands", () => {
  const payloads = injectionStrings();

  it("there are two hundred of them, each different", () => {
    expect(new Set(payloads).size).toBeGreaterThanOrEqual(200);
  });

  it("come back as the same text from a column and from params", async () => {
    const { id: _, ...values } = stage.plan.receivers.find(({ id }) => id === stage.idOf("no9-bedroom"))!;
    let revision = (await stage.project.reload()).revision;
    const created = await ask(POST, { method: "POST", cookie: stage.cookies.owner, params: { projectId: stage.project.id, part: "receivers" }, revision, body: values });
    const { plan } = (await created.json()) as Answer;
    const partId = plan.receivers.at(-1)!.id;
    revision += 1;
    for (const text of payloads) {
      const body = { name: text, says: text };
      const answer = await change(body, {}, { projectId: stage.project.id, part: "receivers", partId });
      expect(answer.status, text).toBe(200);
      const kept = ((await answer.json()) as Answer).plan.receivers.find(({ id }) => id === partId)!;
      expect({ name: kept.name, says: kept.says }).toEqual(body);
    }
    revision = (await stage.project.reload()).revision;
    await ask(DELETE, { method: "DELETE", cookie: stage.cookies.owner, params: { projectId: stage.project.id, part: "receivers", partId }, revision });
  }, 120_000);

  it.each(payloads.slice(0, 40).map((text) => [text]))("as an id find nothing: %s", async (text) => {
    expect((await change({ area: 2 }, {}, { ...door(), partId: text })).status).toBe(404);
    expect((await change({ area: 2 }, {}, { ...door(), projectId: text })).status).toBe(404);
  });

  it.each([[["a", "b"]], [{ "$ne": null }], [{ "[Op.ne]": null }], [true], [12]])("as a reference are no words: %j", async (value) => {
    expect((await change({ pathId: value })).status).toBe(422);
    expect((await change({ constructionId: value })).status).toBe(422);
  });
});
