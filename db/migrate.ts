import "server-only";
import path from "node:path";
import { migrate } from "drizzle-orm/libsql/migrator";
import { write } from "./client";

/** Bring the database to the newest generated migration; does nothing when it is there already. */
export async function migrateDatabase(): Promise<void> {
  const migrationsFolder = path.join(/* turbopackIgnore: true */ process.cwd(), "drizzle");
  await write((db) => migrate(db, { migrationsFolder }));
}
