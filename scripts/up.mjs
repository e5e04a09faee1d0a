// npm run up: from a fresh clone to a running workshop; run again it is quick and loses nothing.
import { spawn } from "node:child_process";
import { build, freePort, install, NEXT, requireNode, ROOT, run, TSX } from "./steps.mjs";

requireNode();
const port = Number(process.env.PORT || 3000);
// A demo unless told otherwise: "production" refuses to start without its own SESSION_SECRET.
const settings = { PINWRIGHT_ENV: process.env.PINWRIGHT_ENV || "local", NEXT_TELEMETRY_DISABLED: "1" };

function stop(message) {
  process.stderr.write(`${message}\n`);
  process.exit(1);
}

async function answers(address) {
  for (let tries = 0; tries < 240; tries += 1) {
    const ok = await fetch(address).then((response) => response.ok, () => false);
    if (ok) return true;
    await new Promise((resolve) => setTimeout(resolve, 250));
  }
  return false;
}

if (!Number.isInteger(port) || port < 1 || port > 65535) stop("PORT must be a number from 1 to 65535.");
// Before the database is touched: a server already running on it must stay its only writer.
if ((await freePort(port)) === null) stop(`Port ${port} is in use. Stop what runs there, or choose another: PORT=3001 npm run up`);
if ((await install()) !== 0) stop("Installing failed; see above.");
const seeded = await run(process.execPath, [TSX, "--conditions=react-server", "seed/run.ts", "--accounts"], { env: settings, quiet: true });
if (seeded.code !== 0) stop(`${seeded.output}\nThe database could not be prepared; see above.`);
if ((await build()) !== 0) stop("Building failed; see above.");

const server = spawn(process.execPath, [NEXT, "start", "-p", String(port)], { cwd: ROOT, env: { ...process.env, ...settings, NODE_ENV: "production" }, stdio: "inherit" });
server.on("close", (code) => process.exit(code ?? 0));
for (const signal of ["SIGINT", "SIGTERM"]) process.on(signal, () => server.kill(signal));

if (await answers(`http://127.0.0.1:${port}/sign-in`)) {
  process.stdout.write(`\n${seeded.output}\nPinwright runs at http://localhost:${port}  (Ctrl+C stops it)\n`);
} else {
  server.kill("SIGTERM");
  stop("The server does not answer; see above.");
}
