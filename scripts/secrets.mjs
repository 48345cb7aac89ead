import { randomBytes } from "node:crypto";
import { existsSync, readFileSync, renameSync, writeFileSync } from "node:fs";
import { join } from "node:path";

const fresh = () => randomBytes(32).toString("base64url");

/** The secrets beside the data they guard, made once and readable by their owner only. */
export function secretsIn(folder) {
  const path = join(folder, "secrets.json");
  if (existsSync(path)) return JSON.parse(readFileSync(path, "utf8"));
  const secrets = secretsFresh();
  writeFileSync(`${path}.new`, JSON.stringify(secrets, null, 2), { mode: 0o600 });
  renameSync(`${path}.new`, path);
  return secrets;
}

/** Secrets nobody has used before. */
export function secretsFresh() {
  return { sessionKey: fresh(), pepper: fresh(), adminPassword: fresh(), ownerPassword: fresh() };
}

/** What the served product reads from its environment; what the environment already says stands. */
export function productEnvironment({ secrets, databaseUrl, port }) {
  return {
    DATABASE_URL: databaseUrl,
    NEXT_TELEMETRY_DISABLED: "1",
    PORT: String(port),
    STILLYARD_ORIGIN: process.env.STILLYARD_ORIGIN ?? `http://localhost:${port}`,
    STILLYARD_PEPPER: process.env.STILLYARD_PEPPER ?? secrets.pepper,
    STILLYARD_SESSION_KEYS: process.env.STILLYARD_SESSION_KEYS ?? secrets.sessionKey,
  };
}
