import { DatabaseError, UniqueConstraintError } from "sequelize";
import { expect, it } from "vitest";
import { pageFault, Refusal } from "../../app/_server/errors";
import { faultOf } from "../../app/_server/log";
import { gist } from "../../app/_server/reports";
import { User } from "../../models/index";
import { buildUser } from "../build";

const thrownBy = (work: Promise<unknown>) => work.then(() => undefined, (thrown: unknown) => thrown);
const secrets = /log@stillyard\.example|a-hash-of-a-password/;

it("a fault of the database is told with its kind and code, without the statement and its values", async () => {
  const values = { name: "Somebody", email: "log@stillyard.example", passwordHash: "a-hash-of-a-password" };
  await buildUser(values);
  const twice = await thrownBy(buildUser(values));
  const wrong = await thrownBy(User.findOne({ where: { email: "log@stillyard.example", id: "no id" } }));
  expect(twice).toBeInstanceOf(UniqueConstraintError);
  expect(wrong).toBeInstanceOf(DatabaseError);
  expect(JSON.stringify(twice) + JSON.stringify(wrong)).toMatch(secrets);
  for (const [thrown, code] of [[twice, "23505"], [wrong, "22P02"]] as const) {
    expect(faultOf(thrown)).toMatchObject({ code });
    expect(JSON.stringify(faultOf(thrown))).not.toMatch(secrets);
    expect(Object.values(pageFault(thrown))).toEqual([]);
    expect(pageFault(thrown).message).toMatch(/^Fault [0-9a-f-]{36}$/);
  }
});

it("a refusal reaches a page as it is", () => {
  const refusal = new Refusal("missing", "There is nothing here.");
  expect(pageFault(refusal)).toBe(refusal);
});

it("a report of the browser is told by its rule and its place, without queries or other words", () => {
  const report = { "document-uri": "http://localhost/sign-in?next=/secret", "effective-directive": "img-src", "blocked-uri": "https://x.example/a?token=secret", "script-sample": "secret", referrer: "secret", "line-number": 7 };
  expect(gist(JSON.stringify({ "csp-report": report }))).toEqual({ "document-uri": "http://localhost/sign-in", "effective-directive": "img-src", "blocked-uri": "https://x.example/a", "line-number": "7" });
  for (const text of ["secret", "null", "[]", '"secret"', '{"csp-report":"secret"}', '{"csp-report":null}', '{"csp-report":{"blocked-uri":{"secret":1}}}']) expect(gist(text)).toEqual({});
});
