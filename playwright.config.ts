import { defineConfig } from "@playwright/test";

/** `npm test` gives the server's address; by hand, a running `npm start` is taken. */
export default defineConfig({
  testDir: "tests/e2e",
  outputDir: "test-results/browser",
  workers: 1,
  fullyParallel: false,
  forbidOnly: true,
  retries: 0,
  timeout: 90_000,
  globalTimeout: 30 * 60_000,
  expect: { timeout: 15_000 },
  reporter: [["list"]],
  use: {
    baseURL: process.env.E2E_BASE_URL ?? "http://localhost:3000",
    browserName: "chromium",
    viewport: { width: 1440, height: 900 },
    locale: "en-GB",
    trace: "off",
    video: "off",
    screenshot: "only-on-failure",
    launchOptions: {
      executablePath: process.env.E2E_CHROMIUM ?? "/usr/bin/chromium",
      args: [
        "--no-sandbox", "--use-angle=swiftshader", "--enable-unsafe-swiftshader",
        "--disable-background-networking", "--disable-component-update", "--disable-sync",
      ],
    },
  },
});
