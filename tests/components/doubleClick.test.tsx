import { cleanup, render, screen, waitFor } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { Provider } from "jotai";
import { afterEach, expect, it, vi } from "vitest";
import { addPart, saveChanges, savePart } from "@/components/plan/save";
import { usePlanSave } from "@/components/plan/usePlanSave";
import type { Answer } from "@/components/state/plan";
import { PlanProvider } from "@/components/state/PlanProvider";

const answer = (revision: number) => ({ revision, plan: {}, verdict: {} }) as Answer;

/** A server that answers after a while; keeps the key, the method and the body of what it was asked. */
function serve(...statuses: number[]) {
  const asked: { method?: string; key: string | null; body: string }[] = [];
  vi.stubGlobal("fetch", async (_: string, init: RequestInit) => {
    asked.push({ method: init.method, key: new Headers(init.headers).get("idempotency-key"), body: String(init.body) });
    await new Promise((resolve) => setTimeout(resolve, 20));
    const status = statuses.shift() ?? 200;
    if (status === 0) throw new TypeError("no network");
    return Response.json(status === 200 ? answer(asked.length + 1) : { error: { message: "No." } }, { status });
  });
  return asked;
}

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

function Adding() {
  const { save } = usePlanSave("p");
  return (
    <>
      <button onClick={() => void save({ act: "add", part: "fences", values: { name: "A fence" } }, "fence")}>Add</button>
      <button onClick={() => void save({ act: "change", part: "fences", id: "f", patch: { name: "Low" } }, "fence")}>Change</button>
    </>
  );
}

const show = () => render(<Provider><PlanProvider answer={answer(1)}><Adding /></PlanProvider></Provider>);

it("twenty clicks within a second add one fence", async () => {
  const asked = serve();
  show();
  const button = screen.getByRole("button", { name: "Add" });
  for (let click = 0; click < 20; click += 1) {
    button.click();
    await new Promise((resolve) => setTimeout(resolve, 45));
  }
  await new Promise((resolve) => setTimeout(resolve, 100));
  expect(asked).toHaveLength(1);
});

it("the same addition after another act is a second one, and so is it after a refusal", async () => {
  const asked = serve(200, 200, 422, 200);
  show();
  const user = userEvent.setup();
  for (const name of ["Add", "Change", "Add", "Add"]) {
    const before = asked.length;
    await user.click(screen.getByRole("button", { name }));
    await waitFor(() => expect(asked.length).toBe(before + 1));
    await new Promise((resolve) => setTimeout(resolve, 60));
  }
  expect(asked.map(({ method }) => method)).toEqual(["POST", "PATCH", "POST", "POST"]);
});

it("an act whose answer was lost bears its key again; one that was answered gets a new one", async () => {
  const asked = serve(0, 503, 200, 200);
  const fence = { projectId: "p", revision: 4, part: "fences", values: { name: "A fence" } };
  for (let turn = 0; turn < 4; turn += 1) await addPart(fence);
  const [lost, cut, done, anew] = asked.map(({ key }) => key);
  expect(lost).toMatch(/^[0-9a-f]{32}$/);
  expect([cut, done]).toEqual([lost, lost]);
  expect(anew).not.toBe(lost);
});

it("once something else was answered, the same act is a new wish", async () => {
  const asked = serve(0, 200, 200);
  const fence = { projectId: "p", revision: 4, part: "fences", values: { name: "A fence" } };
  await addPart(fence);
  await savePart({ projectId: "p", revision: 4, part: "elements", id: "door", patch: { area: 2 } });
  await addPart(fence);
  expect(new Set(asked.map(({ key }) => key)).size).toBe(3);
});

it("a waiting act keeps its key through 409 and 429", async () => {
  const asked = serve(409, 429, 200);
  const changes = [{ act: "add" as const, part: "fences", values: {} }];
  for (let turn = 0; turn < 3; turn += 1) await saveChanges({ projectId: "p", revision: 4, changes });
  expect(new Set(asked.map(({ key }) => key)).size).toBe(1);
});
