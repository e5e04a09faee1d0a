import { sql } from "drizzle-orm";
import type { Database } from "@/db/client";
import { entries, entryVersions, people } from "@/db/schema";
import type { EntryData } from "@/lib/catalogue/entry-data";
import { foldPartNumber } from "@/lib/catalogue/entry-coherence";
import { versionColumns } from "@/lib/catalogue/version-row";
import { expandVariant } from "./expand-family";
import { POTENTIOMETERS_A } from "./potentiometers";
import { POTENTIOMETERS_B } from "./potentiometers-b";
import { PWM_A } from "./pwm";
import { PWM_B } from "./pwm-b";
import { VOLTAGE } from "./voltage";

export interface SeedEntry { readonly id: string; readonly versionId: string; readonly slug: string; readonly publishedAt: Date; readonly data: EntryData }

/** A fixed id in the form of a ULID: the table's letter, then the number. */
const fixedId = (table: "E" | "V", number: number) => `01J0CAT${table}${String(number).padStart(18, "0")}`;

function slugOf(data: EntryData): string {
  const name = data.name.toLowerCase().replace(/[^a-z0-9]+/g, "-").replace(/^-|-$/g, "");
  return `${name}-${foldPartNumber(data.partNumbers[0] ?? "")}`;
}

const HOUR = 3_600_000;
const DAY = 24 * HOUR;
/** Sheets older than the catalogue were entered five a day from here on. */
const FIRST_DAY = Date.parse("2026-09-02T08:20:00Z");

/** The demo catalogue: every variant of every family, with ids, addresses and dates that never change. */
export function seedEntries(): readonly SeedEntry[] {
  const families = [...POTENTIOMETERS_A, ...POTENTIOMETERS_B, ...PWM_A, ...PWM_B, ...VOLTAGE];
  const items = families.flatMap((family) => family.variants.map((variant) => ({ family, variant })));
  return items.map(({ family, variant }, i) => {
    const number = i + 1;
    const data = expandVariant(family, variant, `ST ${40 + Math.floor(number / 30)} ${String(101 + number * 7).padStart(3, "0")}`);
    const publishedAt = new Date(FIRST_DAY + Math.floor(number / 5) * DAY + (number % 5) * HOUR);
    return { id: fixedId("E", number), versionId: fixedId("V", number), slug: slugOf(data), publishedAt, data };
  });
}

async function anEditor(db: Pick<Database, "select">): Promise<string> {
  const rows = await db.select({ id: people.id, roles: people.roles }).from(people).orderBy(people.id);
  const editor = rows.find((row) => row.roles.includes("editor"));
  if (!editor) throw new Error("seed the people first: an editor publishes the catalogue");
  return editor.id;
}

/**
 * Fill an empty catalogue in the name of the first editor; to be run inside one write, after the people.
 * @throws Error when there is no editor
 */
export async function seedCatalogue(db: Pick<Database, "select" | "insert" | "update">): Promise<void> {
  const publishedBy = await anEditor(db);
  const items = seedEntries();
  await db.insert(entries).values(items.map(({ id, slug, publishedAt }) => ({ id, slug, currentVersionId: null, createdAt: publishedAt, retiredAt: null })));
  await db.insert(entryVersions).values(items.map(({ id, versionId, publishedAt, data }) => ({
    id: versionId, entryId: id, version: 1, publishedBy, publishedAt, ...versionColumns(data),
  })));
  // One statement shows them all; the triggers fill the search tables.
  await db.update(entries).set({ currentVersionId: sql`(SELECT id FROM entry_versions WHERE entry_id = ${entries.id})` }).where(sql`${entries.currentVersionId} IS NULL`);
}
