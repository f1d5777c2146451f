import { defineConfig } from "vitest/config";

const inCi = Boolean(process.env["CI"]);

/** Tests that need the built package (dist/), other processes or the network's registry. */
const built = [
  "test/kernel/**/*.test.ts",
  "test/notebooks/**/*.test.ts",
  "test/project/declarations.test.ts",
];
const packaged = ["test/project/package.test.ts"];

export default defineConfig({
  test: {
    pool: "threads",
    maxWorkers: 2,
    allowOnly: false,
    passWithNoTests: false,
    reporters: inCi ? ["default", ["json", { outputFile: "out/tests.json" }]] : ["default"],
    projects: [
      {
        // pure functions: nothing to isolate, which halves the time
        test: {
          name: "unit",
          include: ["test/**/*.test.ts"],
          exclude: [...built, ...packaged, "test/bench/**"],
          pool: "threads",
          isolate: false,
          testTimeout: 20_000,
        },
      },
      {
        test: {
          name: "built",
          include: built,
          globalSetup: "test/project/buildOnce.ts",
          pool: "forks",
          testTimeout: 120_000,
          hookTimeout: 120_000,
        },
      },
      {
        test: {
          name: "package",
          include: packaged,
          globalSetup: "test/project/buildOnce.ts",
          pool: "forks",
          testTimeout: 300_000,
          hookTimeout: 300_000,
        },
      },
    ],
  },
});
