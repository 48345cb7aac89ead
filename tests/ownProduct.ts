import { afterAll } from "vitest";
import { serveForTests } from "../scripts/product.mjs";
import { createEmptyDatabase } from "./database";

// Each journey has a product and a database of its own, named before the file's imports are read. Where only the address
// of a served product is given, the journey walks there.
if (process.env.DATABASE_ADMIN_URL) {
  const databaseUrl = await createEmptyDatabase();
  const product = await serveForTests({ databaseUrl, folder: process.env.STILLYARD_BUILD_FOLDER });
  process.env.STILLYARD_URL = product.address;
  afterAll(() => product.stop());
}
