import "server-only";
import { createHash } from "node:crypto";
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { Refusal } from "../errors";

const SHORTEST = 15;
const LONGEST = 128;
/** What has to be left of a password beside names that anybody would guess. */
const OWN_LETTERS = 8;

export interface Owner {
  name: string;
  email: string;
}

/** Refuses a password that is short, common or guessed from its owner, in words for the field. */
export function requireGoodPassword(password: string, owner: Owner): void {
  const fault = passwordFault(password, owner);
  if (fault) throw new Refusal("invalid", "This password does not fit.", { fields: { password: fault } });
}

/** Why a password is refused, or undefined. */
export function passwordFault(password: string, owner: Owner): string | undefined {
  const length = [...password].length;
  if (length < SHORTEST) return `At least ${SHORTEST} characters. A few words that have nothing to do with each other do well.`;
  if (length > LONGEST) return `At most ${LONGEST} characters.`;
  if (isCommon(password)) return "This is among the first that anybody would try.";
  if (isMadeOfNames(password, owner)) return "This is made of names: yours, your address or ours.";
  return undefined;
}

/** A listed one as it is, with digits or signs around it, twice over, or two listed ones in a row. */
function isCommon(password: string): boolean {
  const whole = password.normalize("NFKC").toLowerCase().replace(/\s+/g, "");
  const bare = whole.replace(/^[\d\p{P}\p{S}]+|[\d\p{P}\p{S}]+$/gu, "");
  return [whole, bare, pieceOf(whole), pieceOf(bare)].some((form) => form.length < 4 || isListed(form)) || isTwoListed(bare);
}

/** The shortest piece that a text repeats, also with its last turn cut short. */
function pieceOf(text: string): string {
  const length = Array.from(text, (_, index) => index + 1).find((length) => text === text.slice(0, length).repeat(text.length).slice(0, text.length));
  return text.slice(0, length);
}

const isTwoListed = (text: string) =>
  Array.from(text, (_, index) => index).some((at) => at >= 4 && text.length - at >= 4 && isListed(text.slice(0, at)) && isListed(text.slice(at)));

const marksOf = (text: string) => createHash("sha256").update(text).digest("base64url").slice(0, 8);
const isListed = (text: string) => commonMarks().has(marksOf(text));

let marks: Set<string> | undefined;

function commonMarks(): Set<string> {
  return (marks ??= readMarks());
}

function readMarks(): Set<string> {
  // A plain file beside the records, not part of any bundle.
  const file = join(/* turbopackIgnore: true */ process.cwd(), "data", "common-passwords.txt");
  return new Set(readFileSync(file, "utf8").split("\n").filter((line) => line !== "" && !line.startsWith("#")));
}

/** Whether little is left of it without the names of the product and of its owner. */
function isMadeOfNames(password: string, { name, email }: Owner): boolean {
  const words = ["stillyard", ...name.split(/\s+/), ...email.split(/[@.+_-]+/)].map(lettersOf).filter((word) => word.length >= 3);
  const longestFirst = words.toSorted((one, other) => other.length - one.length);
  const whole = lettersOf(password);
  const left = longestFirst.reduce((text, word) => text.replaceAll(word, ""), whole);
  return left.length < whole.length && left.replace(/\d/g, "").length < OWN_LETTERS;
}

const lettersOf = (text: string) => text.normalize("NFKC").toLowerCase().replace(/[^\p{L}\p{N}]/gu, "");
