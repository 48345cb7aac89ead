import { afterAll, expect, it } from "vitest";
import { startMortalCluster, type MortalCluster } from "../faults/killed/cluster";
import { killUnderWriters } from "../faults/killed/underWriters";
import { openOwnDatabase } from "./ownDatabase";

const KILLS = Number(process.env.STILLYARD_KILLS ?? 5);

let cluster: MortalCluster | undefined;
afterAll(() => cluster?.stop());

it(`PostgreSQL killed ${KILLS} times under eight writers: every confirmed change is there, the others are told 503 within 6 s, and service comes back by itself`, async () => {
  expect.hasAssertions();
  await openOwnDatabase();
  cluster = await startMortalCluster();
  await killUnderWriters(cluster, KILLS);
});
