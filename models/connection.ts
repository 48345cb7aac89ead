import pg from "pg";
import { Sequelize } from "sequelize";

declare global {
  var stillyardConnection: Sequelize | undefined;
}

/**
 * The one pool of a process. Pages and routes are separate bundles, so it hangs on globalThis. The address is read when
 * the first connection is opened: a build imports this file without one.
 */
export const connection: Sequelize = (globalThis.stillyardConnection ??= connect());

function connect(): Sequelize {
  const sequelize = new Sequelize({
    dialect: "postgres",
    dialectModule: pg,
    logging: false,
    define: { timestamps: false, underscored: true },
    pool: { max: 10, min: 0, acquire: 5_000, idle: 10_000 },
    // A fault in the pool's own connecting is told once, to the asker.
    retry: { max: 1 },
    dialectOptions: {
      application_name: "stillyard",
      connectionTimeoutMillis: 3_000,
      keepAlive: true,
      // Ours, should the server's own limit below not arrive: a line that swallows what is sent says nothing.
      query_timeout: 6_000,
      statement_timeout: 5_000,
      lock_timeout: 3_000,
      idle_in_transaction_session_timeout: 10_000,
    },
  });
  sequelize.addHook("beforeConnect", "address", (config) => void Object.assign(config, readAddress()));
  return sequelize;
}

function readAddress() {
  const text = process.env.DATABASE_URL;
  if (!text) throw new Error("DATABASE_URL is not set.");
  const url = new URL(text);
  return {
    host: decodeURIComponent(url.hostname),
    port: url.port || "5432",
    username: decodeURIComponent(url.username),
    password: decodeURIComponent(url.password),
    database: decodeURIComponent(url.pathname.slice(1)),
  };
}
