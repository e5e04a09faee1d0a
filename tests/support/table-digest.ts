import { createHash } from "node:crypto";
import { sql } from "drizzle-orm";
import { readDb } from "@/db/client";

/** Rows and a digest of the whole content of every table, to see that nothing was changed. */
export async function tableDigest(): Promise<Readonly<Record<string, string>>> {
  const tables = await readDb().all<{ name: string }>(sql`SELECT name FROM sqlite_master WHERE type = 'table' ORDER BY name`);
  const digests: Record<string, string> = {};
  for (const { name } of tables) {
    const rows = await readDb().all(sql`SELECT * FROM ${sql.identifier(name)}`);
    const text = rows.map((row) => JSON.stringify(row)).sort().join("\n");
    digests[name] = `${rows.length} rows, ${createHash("sha256").update(text).digest("hex")}`;
  }
  return digests;
}
