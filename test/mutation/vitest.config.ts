import { defineConfig } from "vitest/config";

/** The tests that hold functions/, without those that need a build or a browser, and without the slow surveys. */
export default defineConfig({
  test: {
    testTimeout: 60_000,
    include: [
      "test/{cells,edge,wall,layer,rf,negative-ions,ion-mix,electrons,magnetised,probe,checks,helpers,matter,numerics}/**/*.test.ts",
      "test/bad-calls.test.ts",
      "test/hardening/{similarity,every-function}.test.ts",
    ],
    server: { deps: { inline: ["unitmath"] } },
  },
});
