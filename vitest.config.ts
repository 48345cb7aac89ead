import { availableParallelism } from "node:os";
import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

const here = (path: string) => fileURLToPath(new URL(path, import.meta.url));

const alias = { "@": here("."), "server-only": here("tests/empty.ts") };

export default defineConfig({
  test: {
    // Many files wait for servers that end and rise again: a core left over would be idle.
    maxWorkers: availableParallelism(),
    slowTestThreshold: 5_000,
    reporters: ["default", "./tests/closing-line.ts"],
    projects: [
      {
        resolve: { alias },
        test: {
          name: "unit",
          environment: "node",
          include: ["tests/house.test.ts", "tests/noise/**/*.test.ts", "tests/data/**/*.test.ts"],
          testTimeout: 60_000,
        },
      },
      {
        resolve: { alias },
        test: {
          name: "database",
          environment: "node",
          include: ["tests/{models,api,faults}/**/*.test.ts"],
          globalSetup: ["tests/cluster.ts"],
          setupFiles: ["tests/ownDatabase.ts"],
          testTimeout: 60_000,
          hookTimeout: 60_000,
        },
      },
      {
        resolve: { alias },
        test: {
          name: "components",
          environment: "jsdom",
          include: ["tests/components/**/*.test.{ts,tsx}"],
          testTimeout: 20_000,
        },
      },
      {
        resolve: { alias },
        test: {
          name: "journeys",
          environment: "node",
          include: ["tests/journeys/**/*.test.ts"],
          expect: { poll: { timeout: 15_000 } },
          globalSetup: ["tests/served.ts"],
          setupFiles: ["tests/ownProduct.ts"],
          fileParallelism: false,
          testTimeout: 120_000,
          hookTimeout: 120_000,
        },
      },
      {
        resolve: { alias },
        test: {
          name: "proof",
          environment: "node",
          include: ["tests/proof/**/*.proof.ts"],
          globalSetup: ["tests/served.ts"],
          fileParallelism: false,
          testTimeout: 900_000,
          hookTimeout: 900_000,
        },
      },
    ],
  },
});
