import { spawn } from "node:child_process";
import { expect, test } from "@playwright/test";

/** Starts the built server with these settings; resolves to its exit code and what it said, or null when it still runs after 20 s. */
function start(settings: Readonly<Record<string, string>>): Promise<{ readonly code: number | null; readonly said: string }> {
  const inherited = Object.fromEntries(Object.entries(process.env).filter(([name]) => !["PINWRIGHT_ENV", "SESSION_SECRET", "DATABASE_URL"].includes(name)));
  const server = spawn(process.execPath, ["node_modules/next/dist/bin/next", "start", "-p", "0"], { env: { ...inherited, NODE_ENV: "production", ...settings } as NodeJS.ProcessEnv });
  let said = "";
  for (const stream of [server.stdout, server.stderr]) stream.on("data", (part: Buffer) => { said += part.toString(); });
  return new Promise((resolve) => {
    const timer = setTimeout(() => server.kill(), 20_000);
    server.on("close", (code) => { clearTimeout(timer); resolve({ code, said }); });
  });
}

test("a production server without a secret of its own does not start, and says why", async () => {
  const { code, said } = await start({ DATABASE_URL: "file:./data/never-opened.db" });
  expect(code).toBe(1);
  expect(said).toContain("SESSION_SECRET is not set");
  const short = await start({ DATABASE_URL: "file:./data/never-opened.db", SESSION_SECRET: "too short" });
  expect(short.code).toBe(1);
  expect(short.said).toContain("at least 32");
});
