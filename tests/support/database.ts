import { copyFileSync, mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, afterEach, beforeEach } from "vitest";
import { closeDatabase, write } from "@/db/client";
import { migrateDatabase } from "@/db/migrate";
import { forgetEnv } from "@/lib/env";

const SECRET = "only-for-tests-0123456789abcdefghij";

function point(file: string): void {
  process.env.DATABASE_URL = `file:${file}`;
  process.env.SESSION_SECRET = SECRET;
  process.env.PINWRIGHT_ENV = "local";
  process.env.LOG_LEVEL = "silent";
  forgetEnv();
}

/** Migrated once a test file; the log is folded in, so that one file is the whole database. */
async function makeTemplate(file: string): Promise<void> {
  point(file);
  await migrateDatabase();
  await write((db) => db.run("PRAGMA wal_checkpoint(TRUNCATE)"));
  await closeDatabase();
}

/** Gives every test of the file a fresh copy of a migrated, empty database. */
export function eachTestOwnDatabase(): void {
  const folder = mkdtempSync(path.join(tmpdir(), "pinwright-test-"));
  const template = path.join(folder, "template.db");
  let made: Promise<void> | null = null;
  let count = 0;

  beforeEach(async () => {
    made ??= makeTemplate(template);
    await made;
    const file = path.join(folder, `${(count += 1)}.db`);
    copyFileSync(template, file);
    point(file);
  });
  afterEach(closeDatabase);
  afterAll(() => rmSync(folder, { recursive: true, force: true }));
}
