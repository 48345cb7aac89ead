import { Transaction } from "sequelize";
import { beforeAll, describe, expect, it } from "vitest";
import { GET as HEALTH } from "../../app/api/health/route";
import { GET } from "../../app/api/projects/[projectId]/route";
import { PATCH } from "../../app/api/projects/[projectId]/[part]/[partId]/route";
import { inTransaction } from "../../app/_server/transactions";
import { connection, Project, User } from "../../models/index";
import { buildStage, type Stage } from "../api/actors";
import { ask } from "../build";

let stage: Stage;
beforeAll(async () => {
  stage = await buildStage();
});

const open = () => ask(GET, { cookie: stage.cookies.owner, params: { projectId: stage.project.id } });

async function change() {
  const { revision } = await stage.project.reload();
  const params = { projectId: stage.project.id, part: "elements", partId: stage.idOf("yard-door") };
  return ask(PATCH, { method: "PATCH", cookie: stage.cookies.owner, params, revision, body: { area: 1 + Math.random() } });
}

async function seconds<T>(work: () => Promise<T>): Promise<{ took: number; result: T }> {
  const from = performance.now();
  const result = await work();
  return { took: (performance.now() - from) / 1000, result };
}

describe("the database", () => {
  it("runs every connection under its limits", async () => {
    const names = ["statement_timeout", "lock_timeout", "idle_in_transaction_session_timeout"];
    const [rows] = await connection.query("select name, setting from pg_settings where name in (:names) order by name", { replacements: { names } });
    expect(rows).toEqual([
      { name: "idle_in_transaction_session_timeout", setting: "10000" },
      { name: "lock_timeout", setting: "3000" },
      { name: "statement_timeout", setting: "5000" },
    ]);
  });

  it("held up by somebody's lock: 503 after 3 s, and the next change is saved", async () => {
    const holder = await connection.transaction();
    await Project.findOne({ where: { id: stage.project.id }, lock: holder.LOCK.UPDATE, transaction: holder });
    const { took, result } = await seconds(change);
    await holder.rollback();
    expect([result.status, result.headers.get("retry-after")]).toEqual([503, "2"]);
    expect(took).toBeGreaterThan(2.5);
    expect(took).toBeLessThan(5);
    expect((await change()).status).toBe(200);
  });

  it("with every connection taken: a hundred requests are told 503 after 5 s, health answers meanwhile, and it recovers at once", async () => {
    const holders = await Promise.all(Array.from({ length: 10 }, () => connection.transaction()));
    const waiting = seconds(() => Promise.all(Array.from({ length: 100 }, open)));
    const health = await seconds(async () => HEALTH());
    expect([health.result.status, health.took < 1]).toEqual([200, true]);
    const { took, result } = await waiting;
    expect(result.map(({ status }) => status)).toEqual(Array(100).fill(503));
    expect(took).toBeLessThan(7);
    await Promise.all(holders.map((holder) => holder.rollback()));
    expect((await open()).status).toBe(200);
  });

  it("two transactions that cross their locks both end well", async () => {
    const [first, second] = [stage.users.client.id, stage.users.builder.id];
    let tries = 0;
    const locking = (order: string[]) =>
      inTransaction(async (transaction: Transaction) => {
        tries += 1;
        for (const id of order) {
          await User.findOne({ where: { id }, lock: transaction.LOCK.UPDATE, transaction });
          await new Promise((resolve) => setTimeout(resolve, 200));
        }
        return true;
      });
    expect(await Promise.all([locking([first, second]), locking([second, first])])).toEqual([true, true]);
    expect(tries).toBeGreaterThan(2);
  });

  it("a fault inside a change leaves nothing of it", async () => {
    const before = await stage.project.reload();
    await expect(
      inTransaction(async (transaction) => {
        await Project.update({ name: "Half" }, { where: { id: before.id }, fields: ["name"], transaction });
        throw new Error("fault");
      }),
    ).rejects.toThrow("fault");
    expect((await stage.project.reload()).name).toBe("The yard");
  });
});
