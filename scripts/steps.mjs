// What `up` and `verify` have in common. Plain JavaScript without packages: it runs before anything is installed.
import { spawn } from "node:child_process";
import { createHash } from "node:crypto";
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from "node:fs";
import { createServer } from "node:net";
import path from "node:path";
import { fileURLToPath } from "node:url";

export const ROOT = path.dirname(path.dirname(fileURLToPath(import.meta.url)));
export const NEXT = path.join(ROOT, "node_modules", "next", "dist", "bin", "next");
export const TSX = path.join(ROOT, "node_modules", "tsx", "dist", "cli.mjs");

const INSTALL_STAMP = path.join(ROOT, "node_modules", ".installed-from");
const BUILD_STAMP = path.join(ROOT, ".next", "built-from");
const SOURCES = ["app", "components", "lib", "db", "public", "proxy.ts", "instrumentation.ts", "next.config.mjs", "postcss.config.mjs", "tailwind.config.ts", "tsconfig.json", "package.json", "package-lock.json"];

/** Run a command in the project; resolves to its exit code, and to its output when it is kept instead of shown. */
export function run(command, args, { env = {}, quiet = false } = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, args, { cwd: ROOT, env: { ...process.env, ...env }, stdio: ["ignore", quiet ? "pipe" : "inherit", "inherit"] });
    let output = "";
    child.stdout?.on("data", (part) => { output += part; });
    child.on("error", (error) => { process.stderr.write(`${command}: ${error.message}\n`); resolve({ code: 127, output }); });
    child.on("close", (code, signal) => resolve({ code: signal ? 1 : (code ?? 1), output }));
  });
}

/** Every file below a path, in a fixed order. */
function filesOf(place) {
  const full = path.join(ROOT, place);
  if (!existsSync(full)) return [];
  if (statSync(full).isFile()) return [place];
  return readdirSync(full, { recursive: true }).map((name) => path.join(place, name)).filter((name) => statSync(path.join(ROOT, name)).isFile()).sort();
}

function hashOf(places) {
  const hash = createHash("sha256").update(process.version);
  for (const file of places.flatMap(filesOf)) {
    if (/\.test\.tsx?$/.test(file)) continue;
    hash.update(`${file}\0`).update(readFileSync(path.join(ROOT, file))).update("\0");
  }
  return hash.digest("hex");
}

const read = (file) => (existsSync(file) ? readFileSync(file, "utf8") : null);

/** npm ci, unless what is installed came from this very lock file. */
export async function install() {
  const wanted = hashOf(["package-lock.json", ".npmrc"]);
  if (read(INSTALL_STAMP) === wanted) return 0;
  const { code } = await run("npm", ["ci", "--no-audit", "--no-fund"]);
  if (code === 0) writeFileSync(INSTALL_STAMP, wanted);
  return code;
}

/** next build, unless the build there is came from these very sources. */
export async function build() {
  const wanted = hashOf(SOURCES);
  if (read(BUILD_STAMP) === wanted && existsSync(path.join(ROOT, ".next", "BUILD_ID"))) return 0;
  const { code } = await run(process.execPath, [NEXT, "build"], { env: { NODE_ENV: "production", NEXT_TELEMETRY_DISABLED: "1" } });
  if (code === 0) {
    mkdirSync(path.dirname(BUILD_STAMP), { recursive: true });
    writeFileSync(BUILD_STAMP, wanted);
  }
  return code;
}

/** Is the port free on this machine? 0 asks for any. Resolves to the port, or null. */
export function freePort(port) {
  return new Promise((resolve) => {
    const server = createServer();
    server.once("error", () => resolve(null));
    server.listen(port, () => {
      const { port: got } = server.address();
      server.close(() => resolve(got));
    });
  });
}

/** Refuse a Node that is too old before anything else fails in a stranger way. */
export function requireNode() {
  const [major, minor] = process.versions.node.split(".").map(Number);
  if (major > 20 || (major === 20 && minor >= 9)) return;
  process.stderr.write(`Pinwright needs Node 20.9 or later; this is ${process.versions.node}.\n`);
  process.exit(1);
}
