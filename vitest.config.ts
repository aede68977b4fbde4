import { defineConfig } from "vitest/config";

/** Tests that read the demo's site; it is made, and a browser started, only when one of them runs. */
const OF_THE_SITE = "test/{site,browser}/**/*.test.ts";

export default defineConfig({
  test: {
    pool: "forks",
    globals: false,
    // Tests of commands start programs of their own, which takes long on a busy machine.
    testTimeout: 60_000,
    hookTimeout: 60_000,
    projects: [
      { extends: true, test: { name: "program", include: ["test/**/*.test.ts"], exclude: [OF_THE_SITE] } },
      { extends: true, test: { name: "site", include: [OF_THE_SITE], globalSetup: "test/helpers/site-setup.ts" } },
    ],
  },
});
