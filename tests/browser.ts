import { readFileSync } from "node:fs";
import { type Browser, chromium, type Page } from "playwright-core";

export const address = process.env.STILLYARD_URL ?? "";

type Person = { key: string; name: string; email: string; password: string };
const people: Person[] = JSON.parse(readFileSync("data/examples/people.json", "utf8"));

/** Debian's Chromium, which needs these two switches when it runs as root or in a small container. */
export function openBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: "/usr/bin/chromium",
    args: ["--no-sandbox", "--disable-dev-shm-usage"],
  });
}

/** Signs a person of the demo in through the sign-in page. */
export async function signIn(page: Page, key: string): Promise<void> {
  const person = people.find((candidate) => candidate.key === key);
  if (!person) throw new Error(`The demo knows no ${key}.`);
  await page.goto(`${address}/sign-in`);
  await page.getByLabel("E-mail").fill(person.email);
  await page.getByLabel("Password", { exact: true }).fill(person.password);
  await page.getByRole("button", { name: "Sign in" }).click();
  await page.waitForURL((url) => !url.pathname.startsWith("/sign-in"));
}

/** All that a page complains of from here on: faults of its scripts, and whatever its policy blocked. */
export function listenForComplaints(page: Page): string[] {
  const complaints: string[] = [];
  page.on("pageerror", (fault) => complaints.push(fault.message));
  page.on("console", (message) => {
    if (message.type() === "error" && !message.text().startsWith("Failed to load resource")) complaints.push(message.text());
  });
  page.on("request", (request) => {
    if (new URL(request.url()).pathname === "/api/csp") complaints.push(`blocked: ${request.postData()}`);
  });
  return complaints;
}
