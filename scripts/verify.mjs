// npm run verify: everything that must hold, and one line at the end that says how much of it does.
import { existsSync, mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { build, freePort, install, NEXT, requireNode, ROOT, run } from "./steps.mjs";

requireNode();
const bin = (...parts) => path.join(ROOT, "node_modules", ...parts);
const reports = mkdtempSync(path.join(tmpdir(), "pinwright-verify-"));
const total = { passed: 0, failed: 0 };

function count(passed, failed) {
  total.passed += passed;
  total.failed += failed;
}

const node = (...args) => run(process.execPath, args);
const heading = (text) => process.stdout.write(`\n== ${text} ==\n`);

/** A stage that either holds or does not. */
async function stage(name, work) {
  heading(name);
  const code = await work();
  count(code === 0 ? 1 : 0, code === 0 ? 0 : 1);
  if (code !== 0) process.stdout.write(`${name}: failed\n`);
  return code === 0;
}

function readReport(file) {
  try {
    return JSON.parse(readFileSync(file, "utf8"));
  } catch {
    return null;
  }
}

/** Tests by vitest. A file that does not load, a test left out and a run that breaks off all count as failed. */
async function vitest(name, places) {
  heading(name);
  const file = path.join(reports, `${name}.json`);
  const { code } = await node(bin("vitest", "vitest.mjs"), "run", ...places, "--reporter=default", "--reporter=json", `--outputFile.json=${file}`);
  const report = readReport(file);
  if (!report) return count(0, 1);
  const broken = report.testResults.filter((result) => result.status === "failed" && !result.assertionResults.some((one) => one.status === "failed")).length;
  const failed = report.numFailedTests + report.numPendingTests + report.numTodoTests + broken;
  count(report.numPassedTests, failed === 0 && code !== 0 ? 1 : failed);
}

const CHROMIUM = process.env.CHROMIUM_PATH || "/usr/bin/chromium";

/** Debian's Chromium; installed when this may be done here, else said plainly. */
async function chromium() {
  if (existsSync(CHROMIUM)) return 0;
  if (process.getuid?.() !== 0 || !existsSync("/etc/debian_version")) {
    process.stdout.write(`Missing: Chromium at ${CHROMIUM}. Install it (Debian: apt-get install chromium) or set CHROMIUM_PATH.\n`);
    return 1;
  }
  const update = await run("apt-get", ["update", "-q"]);
  if (update.code !== 0) return update.code;
  const env = { DEBIAN_FRONTEND: "noninteractive" };
  const { code } = await run("apt-get", ["install", "-y", "-q", "--no-install-recommends", "chromium"], { env });
  return code === 0 && !existsSync(CHROMIUM) ? 1 : code;
}

async function browser() {
  heading("browser tests");
  const file = path.join(reports, "browser.json");
  const port = String(await freePort(0));
  const { code } = await run(process.execPath, [bin("@playwright", "test", "cli.js"), "test", "--reporter=line,json"], {
    env: { PLAYWRIGHT_JSON_OUTPUT_NAME: file, E2E_PORT: port, CHROMIUM_PATH: CHROMIUM, CI: "1" },
  });
  const stats = readReport(file)?.stats;
  if (!stats) return count(0, 1);
  const failed = stats.unexpected + stats.flaky + stats.skipped;
  count(stats.expected, failed === 0 && code !== 0 ? 1 : failed);
}

if (await stage("install", install)) {
  await stage("lint", async () => (await node(bin("eslint", "bin", "eslint.js"), ".", "--max-warnings", "0")).code);
  await stage("types", async () => {
    const typegen = await node(NEXT, "typegen");
    return typegen.code || (await node(bin("typescript", "bin", "tsc"), "--noEmit")).code;
  });
  await vitest("unit", ["lib/", "components/", "db/", "seed/", "tests/published-values", "tests/benchmark"]);
  await vitest("engine", ["tests/engine"]);
  await vitest("integration", ["tests/integration"]);
  const built = await stage("build", build);
  const hasBrowser = await stage("chromium", chromium);
  if (built && hasBrowser) await browser();
}

rmSync(reports, { recursive: true, force: true });
process.stdout.write(`\n${total.passed} passed, ${total.failed} failed\n`);
process.exit(total.failed === 0 ? 0 : 1);
