import { randomBytes } from "node:crypto";
import { mkdtempSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { defineConfig } from "@playwright/test";

// The configuration is read again in every worker; folder and secret are chosen once and handed down.
process.env.E2E_FOLDER ??= mkdtempSync(path.join(tmpdir(), "pinwright-browser-"));
process.env.E2E_SECRET ??= randomBytes(32).toString("base64url");
const port = process.env.E2E_PORT ?? "3217";
const baseURL = `http://127.0.0.1:${port}`;

const CHROMIUM_ARGS = ["--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync"];

/** What does not hang on the screen's size is tested at one of them. */
const ONCE = "once/**/*.spec.ts";
const PHONE = { viewport: { width: 390, height: 844 }, hasTouch: true };

export default defineConfig({
  testDir: "tests/e2e",
  outputDir: "test-results",
  timeout: 60_000,
  workers: 2,
  fullyParallel: false,
  forbidOnly: true,
  retries: 0,
  reporter: [["line"]],
  globalTeardown: "./tests/support/remove-browser-folder.ts",
  use: {
    baseURL,
    browserName: "chromium",
    // A trace of every test makes them a quarter slower. A failed one leaves its picture; E2E_TRACE=1 records the rest.
    trace: process.env.E2E_TRACE ? "retain-on-failure" : "off",
    screenshot: "only-on-failure",
    launchOptions: { executablePath: process.env.CHROMIUM_PATH ?? "/usr/bin/chromium", args: CHROMIUM_ARGS },
  },
  projects: [
    { name: "phone", testIgnore: ONCE, use: PHONE },
    { name: "desk", testIgnore: ONCE, use: { viewport: { width: 1280, height: 800 } } },
    { name: "once", testMatch: ONCE, use: PHONE },
  ],
  webServer: {
    // A database of its own, filled with the demo workshop before the server opens it.
    command: `node node_modules/tsx/dist/cli.mjs --conditions=react-server seed/run.ts && node node_modules/next/dist/bin/next start -p ${port}`,
    url: `${baseURL}/sign-in`,
    timeout: 120_000,
    reuseExistingServer: false,
    env: {
      DATABASE_URL: `file:${path.join(process.env.E2E_FOLDER, "browser.db")}`,
      SESSION_SECRET: process.env.E2E_SECRET,
      PINWRIGHT_ENV: "local",
      NEXT_TELEMETRY_DISABLED: "1",
      LOG_LEVEL: "error",
    },
  },
});
