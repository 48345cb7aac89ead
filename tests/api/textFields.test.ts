import { beforeAll, describe, expect, it } from "vitest";
import { injectionStrings } from "../injections";
import { expectKept, expectYardKept, openTextFields, type TextField } from "./textWays";

const texts = injectionStrings();
let fields: readonly TextField[];
beforeAll(async () => {
  fields = await openTextFields();
}, 120_000);

describe("texts that look like commands, in every field that takes words", () => {
  it("there are such fields in most kinds of parts", () => {
    expect(fields.length).toBeGreaterThan(20);
    expect(new Set(fields.map(({ part }) => part)).size).toBeGreaterThan(9);
    expect(texts.length).toBeGreaterThanOrEqual(200);
  });

  // The slow proof has each text in every field.
  it("each of the two hundred comes back as the same text from some, and each field keeps ten of them", async () => {
    const step = Math.ceil(texts.length / 10);
    expect(step).toBeLessThanOrEqual(fields.length);
    for (let turn = 0; turn < texts.length; turn += step) await expectKept(turn);
  });

  it("and from the yard's own name or words", async () => {
    for (let place = 0; place < texts.length; place += 2) await expectYardKept(texts[place]!, texts[place + 1] ?? texts[0]!);
  });
});
