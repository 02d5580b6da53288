import { defineConfig } from "@playwright/test";
import { browserLaunch } from "./journeys/browser-launch";

/** Journeys run the production build in a real Chromium, one after another, and are never tried twice. */
export default defineConfig({
  testDir: "./journeys",
  testMatch: "**/*.spec.ts",
  outputDir: "../test-results",
  workers: 1,
  retries: 0,
  fullyParallel: false,
  forbidOnly: true,
  timeout: 120_000,
  expect: { timeout: 10_000 },
  reporter: [["list"]],
  use: { browserName: "chromium", launchOptions: browserLaunch, locale: "en-GB", timezoneId: "UTC", trace: "retain-on-failure" },
});
