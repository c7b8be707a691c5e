import { defineConfig } from "vitest/config";

export default defineConfig({
  resolve: { tsconfigPaths: true },
  test: {
    pool: "threads",
    // Wide: a test says what is right, not how fast the machine under it is.
    testTimeout: 60_000,
    hookTimeout: 180_000,
    projects: [
      {
        extends: true,
        test: {
          name: "unit",
          include: ["{bending,lib,components,app,seeds,scripts}/**/*.test.{ts,tsx}", "tests/{checker,corpus,repro,laws}/**/*.test.ts"],
        },
      },
      {
        extends: true,
        test: {
          name: "integration",
          include: ["db/**/*.test.ts", "tests/integration/**/*.test.ts"],
          globalSetup: ["tests/integration/postgres.global.ts"],
        },
      },
    ],
  },
});
