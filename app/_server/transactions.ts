import "server-only";
import { Transaction } from "sequelize";
import { connection } from "@/models";
import { mayRetry } from "./errors";

/** One transaction; a deadlock or a serialization failure is tried twice more before it is told. */
export async function inTransaction<T>(work: (transaction: Transaction) => Promise<T>, retries = 2): Promise<T> {
  try {
    return await connection.transaction(work);
  } catch (thrown) {
    if (retries === 0 || !mayRetry(thrown)) throw thrown;
    return inTransaction(work, retries - 1);
  }
}

/** Everything read inside is of one moment. */
export function inOneMoment<T>(work: (transaction: Transaction) => Promise<T>): Promise<T> {
  const { REPEATABLE_READ } = Transaction.ISOLATION_LEVELS;
  return connection.transaction({ isolationLevel: REPEATABLE_READ, readOnly: true }, work);
}
