import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

/** Everything that Vite or Vitest would leave behind goes under node_modules, so that the root stays clean. */
const root = fileURLToPath(new URL("..", import.meta.url));

/** A test that asserts nothing proves nothing, so it fails. */
const shared = {
  expect: { requireAssertions: true },
  environment: "node" as const,
  setupFiles: ["tests/seeded.ts"],
};

export default defineConfig({
  root,
  cacheDir: "node_modules/.cache/vite",
  test: {
    projects: [
      {
        extends: true,
        test: {
          ...shared,
          name: "unit",
          include: ["tests/**/*.test.ts"],
          exclude: ["tests/e2e/**", "tests/browser/**"],
          testTimeout: 15_000,
          hookTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          ...shared,
          // Commands run as a user runs them, one file at a time: each starts processes of its own.
          name: "e2e",
          include: ["tests/e2e/**/*.test.ts"],
          fileParallelism: false,
          testTimeout: 120_000,
          hookTimeout: 180_000,
        },
      },
      {
        extends: true,
        test: {
          ...shared,
          name: "browser",
          include: ["tests/browser/**/*.test.ts"],
          fileParallelism: false,
          testTimeout: 120_000,
          hookTimeout: 180_000,
        },
      },
    ],
  },
});
