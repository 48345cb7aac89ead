import { createDatabase } from "./database";

// Each test file has a database of its own, named before the file's imports are read.
process.env.DATABASE_URL = await createDatabase();
process.env.STILLYARD_ORIGIN ??= "http://localhost:3000";
process.env.STILLYARD_SESSION_KEYS ??= "c3RpbGx5YXJkLXRlc3RzLW9ubHktc2Vzc2lvbi1rZXkx";
process.env.STILLYARD_PEPPER ??= "c3RpbGx5YXJkLXRlc3RzLW9ubHktcGVwcGVyLXBlcHBlcg";
