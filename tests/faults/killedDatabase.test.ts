import { afterAll, beforeAll, expect, it } from "vitest";
import { startMortalCluster, type MortalCluster } from "./killed/cluster";
import { killUnderWriters } from "./killed/underWriters";

let cluster: MortalCluster;
beforeAll(async () => {
  cluster = await startMortalCluster();
}, 120_000);
afterAll(() => cluster.stop());

// The slow proof kills it more often.
it("PostgreSQL killed under eight writers: every confirmed change is there, the others are told 503 within 6 s, and service comes back by itself", async () => {
  expect.hasAssertions();
  await killUnderWriters(cluster, 1);
}, 300_000);
