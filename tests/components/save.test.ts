import { afterEach, describe, expect, it, vi } from "vitest";
import { addPart, removePart, savePart } from "../../components/plan/save";
import { createStore } from "jotai";
import { answerAtom, type Answer } from "../../components/state/plan";

const answer = (revision: number) => ({ revision, plan: {}, verdict: {} }) as Answer;
const touched = (id: string) => ({ kind: "element", id, act: "change", before: {}, after: {} });
const stale = (revision: number, ...ids: string[]) => ({
  status: 409,
  body: { error: { message: "Tobi changed this yard in the meantime." }, current: answer(revision), changedBy: { name: "Tobi", at: "2026-12-01T20:00:00.000Z", whole: true, parts: ids.map(touched) } },
});

/** A server that gives these answers, one after the other, and keeps what it was asked. */
function serve(...answers: { status: number; body: unknown }[]) {
  const asked: { method?: string; revision: string | null; address: string }[] = [];
  vi.stubGlobal("fetch", async (address: string, init: RequestInit) => {
    asked.push({ address, method: init.method, revision: new Headers(init.headers).get("if-match") });
    const next = answers.shift();
    if (!next) throw new TypeError("no network");
    return Response.json(next.body, { status: next.status });
  });
  return asked;
}

afterEach(() => vi.unstubAllGlobals());

const door = { projectId: "p", revision: 4, part: "elements", id: "door", patch: { area: 2 } };

describe("saving a part", () => {
  it("a save gives the new answer", async () => {
    const asked = serve({ status: 200, body: answer(5) });
    expect(await savePart(door)).toEqual({ kind: "saved", answer: answer(5) });
    expect(asked).toEqual([{ address: "/api/projects/p/elements/door", method: "PATCH", revision: '"4"' }]);
  });

  it("is sent once more where somebody else changed something else", async () => {
    const asked = serve(stale(7, "roof"), { status: 200, body: answer(8) });
    expect(await savePart(door)).toEqual({ kind: "saved", answer: answer(8) });
    expect(asked.map(({ revision }) => revision)).toEqual(['"4"', '"7"']);
  });

  it("is not sent again over somebody's change of the same part", async () => {
    const asked = serve(stale(7, "roof", "door"));
    expect(await savePart(door)).toMatchObject({ kind: "stale", current: answer(7), changedBy: { name: "Tobi" } });
    expect(asked).toHaveLength(1);
  });

  it("is not sent again where more was changed than the answer names", async () => {
    const { status, body } = stale(307, "roof");
    const asked = serve({ status, body: { ...body, changedBy: { ...body.changedBy, whole: false } } });
    expect(await savePart(door)).toMatchObject({ kind: "stale", current: answer(307) });
    expect(asked).toHaveLength(1);
  });

  it("is sent again once only", async () => {
    const asked = serve(stale(7, "roof"), stale(9, "roof"));
    expect(await savePart(door)).toMatchObject({ kind: "stale", current: answer(9) });
    expect(asked).toHaveLength(2);
  });

  it("is sent again over a change of our own whose answer was lost", async () => {
    serve({ status: 503, body: { error: { message: "Cannot save now." } } });
    expect(await savePart({ ...door, patch: { params: { gapArea: 1 } } })).toMatchObject({ kind: "failed" });
    const late = stale(5, "door");
    const after = { area: 1.9, params: { gapArea: 1, seal: "none" } };
    late.body.changedBy.parts = [{ ...touched("door"), after }];
    const asked = serve(late, { status: 200, body: answer(6) });
    expect(await savePart(door)).toEqual({ kind: "saved", answer: answer(6) });
    expect(asked.map(({ revision }) => revision)).toEqual(['"4"', '"5"']);
  });

  it("is not sent again where somebody else changed it after the lost change", async () => {
    serve({ status: 503, body: { error: { message: "Cannot save now." } } });
    await savePart({ ...door, patch: { params: { gapArea: 1 } } });
    const late = stale(6, "door");
    late.body.changedBy.parts = [{ ...touched("door"), after: { area: 1.9, params: { gapArea: 1 } } }, { ...touched("door"), after: { area: 3, params: { gapArea: 2 } } }];
    serve(late);
    expect(await savePart(door)).toMatchObject({ kind: "stale" });
  });

  it("a removal is never sent again, an addition is", async () => {
    serve(stale(7, "roof"));
    expect(await removePart(door)).toMatchObject({ kind: "stale" });
    serve(stale(7, "roof"), { status: 200, body: answer(8) });
    expect(await addPart({ projectId: "p", revision: 4, part: "fences", values: {} })).toMatchObject({ kind: "saved" });
  });

  it.each([
    [422, { message: "This value does not fit.", fields: { area: "At least 0.01." } }, { kind: "refused", message: "This value does not fit.", fields: { area: "At least 0.01." } }],
    [403, { message: "Only Ines can change this yard." }, { kind: "refused", message: "Only Ines can change this yard.", fields: {} }],
    [409, { message: "Still in use: Roof." }, { kind: "refused", message: "Still in use: Roof.", fields: {} }],
    [401, { message: "You are signed out." }, { kind: "signedOut", message: "You are signed out." }],
    [404, { message: "There is nothing here." }, { kind: "gone", message: "There is nothing here." }],
    [503, { message: "Try again." }, { kind: "failed", message: "Try again." }],
  ])("%i is told in its own words", async (status, error, outcome) => {
    serve({ status, body: { error } });
    expect(await savePart(door)).toEqual(outcome);
  });

  it("no network is a failure in words, and so is an answer that is no JSON", async () => {
    serve();
    expect(await savePart(door)).toMatchObject({ kind: "failed" });
    vi.stubGlobal("fetch", async () => new Response("<html>", { status: 502 }));
    expect(await savePart(door)).toMatchObject({ kind: "failed" });
  });
});

it("the answer on the screen only moves on to a greater revision", () => {
  const store = createStore();
  store.set(answerAtom, answer(3));
  store.set(answerAtom, answer(5));
  store.set(answerAtom, answer(4));
  expect(store.get(answerAtom).revision).toBe(5);
});
