import "server-only";
import { fn } from "sequelize";

/** The database's time so many seconds from now: our own clock may be wrong. The names are PostgreSQL's. */
export function fromNow(seconds: number): Date {
  const interval = fn("make_interval", 0, 0, 0, 0, 0, 0, seconds);
  return fn("timestamptz_pl_interval", fn("now"), interval) as unknown as Date; // becomes a moment in the statement
}

export const databaseNow = () => fn("now") as unknown as Date; // becomes a moment in the statement
