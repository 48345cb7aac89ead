import { expect, it } from "vitest";
import { injectionStrings } from "../injections";
import { openOwnDatabase } from "./ownDatabase";

const texts = injectionStrings();

it(`each of ${texts.length} texts that look like commands comes back as the same text from every field that takes words`, async () => {
  await openOwnDatabase();
  const { expectKept, expectYardKept, openTextFields } = await import("../api/textWays");
  const fields = await openTextFields();
  expect(fields.length).toBeGreaterThan(20);
  for (let turn = 0; turn < texts.length; turn += 1) await expectKept(turn);
  for (const text of texts) await expectYardKept(text, text);
});
