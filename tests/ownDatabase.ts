import { createDatabase } from "./database";

// Each test file has a database of its own, named before the file's imports are read.
process.env.DATABASE_URL = await createDatabase();
process.env.STILLYARD_ORIGIN ??= "http://localhost:3000";
process.env.STILLYARD_SESSION_KEYS ??= "c3RpbGx5YXJkLXRlc3RzLW9ubHktc2Vzc2lvbi1rZXkx";
process.env.STILLYARD_PEPPER ??= "c3RpbGx5YXJkLXRlc3RzLW9ubHktcGVwcGVyLXBlcHBlcg";
// Tests ask faster than people do; what a session may ask is tested by those that set the bound themselves.
process.env.STILLYARD_REQUESTS_A_MINUTE ??= "1000000";
process.env.STILLYARD_WRITES_IN_10_S ??= "1000000";
