import { defineConfig } from "@playwright/test";

// `npm test` starts a seeded server of its own and says where; without it, the one of `npm start` or `npm run dev`.
const { BASE_URL = "http://127.0.0.1:3000", PLAYWRIGHT_JSON_OUTPUT_FILE } = process.env;

export default defineConfig({
  testDir: "tests/e2e",
  outputDir: "test-results",
  forbidOnly: true,
  retries: 0,
  // The tests chart on one seeded database, and two cores carry server, database and browser.
  workers: 1,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  reporter: [["list"], ["json", { outputFile: PLAYWRIGHT_JSON_OUTPUT_FILE ?? "test-results/report.json" }]],
  use: {
    baseURL: BASE_URL,
    screenshot: "only-on-failure",
    trace: "retain-on-failure",
    launchOptions: {
      executablePath: "/usr/bin/chromium",
      args: [
        ...(process.getuid?.() === 0 ? ["--no-sandbox"] : []),
        "--disable-gpu",
        "--disable-quic",
        "--disable-dev-shm-usage",
        "--no-first-run",
        "--disable-background-networking",
        "--disable-component-update",
        "--disable-sync",
      ],
    },
  },
});
