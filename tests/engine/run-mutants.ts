// npm run mutants: makes one mistake after another in a copy of the engine and says which of them the fast engine tests catch.
// A word as argument takes only the mistakes with that word in their name or file.
import { spawnSync } from "node:child_process";
import { cpSync, existsSync, mkdtempSync, readFileSync, rmSync, symlinkSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { fileURLToPath } from "node:url";
import { MUTATIONS, type Mutation } from "./mutations";

const ROOT = fileURLToPath(new URL("../..", import.meta.url));
/** Tests that take seconds, by what they look at; the bench, slips and calibration take minutes and need not see every mistake. */
const CIRCUIT = ["tests/published-values/checks-against-spice", "tests/published-values/wide-values-against-spice", "tests/published-values/mated-against-spice", "tests/published-values/network-against-spice", "tests/engine/worked-cases", "tests/engine/parts"];
const JUDGEMENT = ["tests/published-values/bench-meter", "tests/engine/worked-cases", "tests/engine/contradictory", "tests/engine/bayes-by-hand", "tests/engine/oracle", "tests/engine/proposals", "tests/engine/parts"];
const testsFor = (file: string) => (/\/(circuit|network)\//.test(file) ? CIRCUIT : JUDGEMENT);
const SLOWEST_MS = 600_000;

function copy(): string {
  const folder = mkdtempSync(path.join(tmpdir(), "pinwright-mutants-"));
  for (const what of ["lib/diagnosis", "tests", "vitest.config.ts", "tsconfig.json", "package.json"]) cpSync(path.join(ROOT, what), path.join(folder, what), { recursive: true });
  symlinkSync(path.join(ROOT, "node_modules"), path.join(folder, "node_modules"));
  return folder;
}

interface Report { readonly testResults: readonly { readonly name: string; readonly assertionResults: readonly { readonly status: string; readonly title: string }[] }[] }

/** The first test that fails, or null when all pass. */
function firstFailure(folder: string, tests: readonly string[]): string | null {
  const report = path.join(folder, "report.json");
  rmSync(report, { force: true });
  const { status } = spawnSync(process.execPath, [path.join(ROOT, "node_modules/vitest/vitest.mjs"), "run", ...tests, "--bail=1", "--reporter=json", `--outputFile=${report}`], { cwd: folder, timeout: SLOWEST_MS, stdio: "ignore" });
  if (status === 0) return null;
  if (status === null || !existsSync(report)) return "does not end";
  for (const { name, assertionResults } of (JSON.parse(readFileSync(report, "utf8")) as Report).testResults) {
    const failed = assertionResults.find((one) => one.status === "failed");
    if (failed) return `${path.basename(name, ".test.ts")}: ${failed.title}`;
  }
  return "does not load";
}

function caughtBy(folder: string, { file, search, replace }: Mutation): string | null {
  const place = path.join(folder, file), source = readFileSync(place, "utf8"), parts = source.split(search);
  if (parts.length !== 2) throw new Error(`${file}: found ${parts.length - 1} times: ${search}`);
  writeFileSync(place, parts.join(replace));
  try {
    return firstFailure(folder, testsFor(file));
  } finally {
    writeFileSync(place, source);
  }
}

const say = (text: string) => process.stdout.write(`${text}\n`);
const word = process.argv[2] ?? "", chosen = MUTATIONS.filter(({ name, file }) => `${name} ${file}`.includes(word)), folder = copy();
try {
  const broken = firstFailure(folder, [...new Set([...CIRCUIT, ...JUDGEMENT])]);
  if (broken) throw new Error(`The tests fail without any mistake: ${broken}`);
  let caught = 0;
  for (const m of chosen) {
    const by = caughtBy(folder, m);
    if (by) caught += 1;
    say(`${by ? "caught" : "MISSED"}  ${m.file.replace("lib/diagnosis/", "")}: ${m.name}${by ? `  (${by})` : ""}`);
  }
  say(`${caught} of ${chosen.length} caught`);
  process.exitCode = caught === chosen.length ? 0 : 1;
} finally {
  rmSync(folder, { recursive: true, force: true });
}
