import { defineConfig } from "@playwright/test";

// Software WebGL2, and nothing that asks the network.
const chromiumArguments = [
  "--no-sandbox",
  "--disable-quic",
  "--no-first-run",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
  "--use-gl=angle",
  "--use-angle=swiftshader",
  "--enable-unsafe-swiftshader",
];

export default defineConfig({
  testDir: "tests/e2e",
  outputDir: ".data/test/playwright",
  workers: 1,
  retries: 0,
  timeout: 180_000,
  // The worker may have both cores while a page is asked for.
  expect: { timeout: 20_000 },
  forbidOnly: true,
  reporter: [["line"], ["json", { outputFile: process.env.E2E_REPORT ?? ".data/test/playwright.json" }]],
  use: {
    baseURL: process.env.E2E_BASE_URL,
    browserName: "chromium",
    trace: "off",
    actionTimeout: 20_000,
    launchOptions: { executablePath: "/usr/bin/chromium", args: chromiumArguments },
  },
});
