import { spawn } from "node:child_process";
import { randomBytes } from "node:crypto";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { build, freePort, NEXT, ROOT, run, TSX } from "../../../scripts/steps.mjs";

export interface AppServer { readonly address: string; readonly stop: () => Promise<void> }

const WAIT_MS = 60_000;

async function untilAnswering(address: string): Promise<void> {
  const end = Date.now() + WAIT_MS;
  while (!(await fetch(`${address}/sign-in`).then((response) => response.ok, () => false))) {
    if (Date.now() > end) throw new Error("the server does not answer");
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
}

/**
 * The built app with the demo workshop in a database of its own, on a free port of this machine; built first where it is not.
 * @throws when building, filling or starting fails
 */
export async function startApp(): Promise<AppServer> {
  if ((await build()) !== 0) throw new Error("building failed");
  const folder = mkdtempSync(path.join(tmpdir(), "pinwright-bench-")), port = String(await freePort(0)), address = `http://127.0.0.1:${port}`;
  const env = { DATABASE_URL: `file:${path.join(folder, "bench.db")}`, SESSION_SECRET: randomBytes(32).toString("base64url"), PINWRIGHT_ENV: "local", NEXT_TELEMETRY_DISABLED: "1", LOG_LEVEL: "error" };
  if ((await run(process.execPath, [TSX, "--conditions=react-server", "seed/run.ts"], { env, quiet: true })).code !== 0) throw new Error("the database could not be filled");
  const server = spawn(process.execPath, [NEXT, "start", "-H", "127.0.0.1", "-p", port], { cwd: ROOT, env: { ...process.env, ...env }, stdio: ["ignore", "ignore", "inherit"] });
  const closed = new Promise<void>((resolve) => { server.on("close", () => resolve()); });
  const stop = async () => {
    server.kill("SIGTERM");
    await closed;
    rmSync(folder, { recursive: true, force: true });
  };
  await untilAnswering(address).catch(async (error: unknown) => { await stop(); throw error; });
  return { address, stop };
}
