import { defineConfig } from "vitest/config";

export default defineConfig({
  test: {
    projects: [
      {
        define: { WALLFALL_VERSION: JSON.stringify("test"), WALLFALL_BUILT: JSON.stringify("2026-01-01") },
        test: {
          name: "unit",
          // No test asserts a time, and a busy machine is no failure.
          testTimeout: 60_000,
          // Its ES module has no .mjs name, so Node.js alone would take it for CommonJS.
          server: { deps: { inline: ["unitmath"] } },
          include: ["test/**/*.test.ts"],
          exclude: ["test/browser/**", "test/bench/**", "test/twin/**"],
        },
      },
      {
        test: {
          name: "libreoffice",
          sequence: { groupOrder: 1 },
          server: { deps: { inline: ["unitmath"] } },
          include: ["test/twin/**/*.test.ts"],
          globalSetup: ["test/twin/setup.ts"],
          hookTimeout: 400_000,
        },
      },
      {
        test: {
          name: "browser",
          // Pages are driven when nothing else runs: two cores are few.
          sequence: { groupOrder: 2 },
          include: ["test/browser/**/*.test.ts"],
          globalSetup: ["test/browser/setup.ts"],
          fileParallelism: false,
          testTimeout: 60_000,
          hookTimeout: 120_000,
        },
      },
    ],
  },
});
