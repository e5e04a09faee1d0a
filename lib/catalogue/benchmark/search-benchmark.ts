import { closeDatabase, readDb, write, type Database } from "@/db/client";
import { migrateDatabase } from "@/db/migrate";
import { entries, entryVersions, people } from "@/db/schema";
import { seedEntries } from "@/seed/catalogue";
import type { EntryData } from "../entry-data";
import { search } from "../search-entries";
import { versionColumns } from "../version-row";

/**
 * Times the search on the demo catalogue and on 5,000 synthetic entries and prints the figures:
 *   DATABASE_URL=file:./data/search-benchmark.db npx tsx --conditions=react-server lib/catalogue/benchmark/search-benchmark.ts
 * The database must be new: it is filled here, and refused when there is anything in it.
 * With --each every query's best time as well. Not a test: a busy machine must not turn it red.
 */
const QUERIES = [
  "", "ladder", "AMI 4-210 B", "ami4210b", "BHW/3307/12", "potentimeter", "pressre sensr", "tarctor throtle", "BN/BU/BK", "brown blue wire",
  "bn", "5 V", "triangle", "boomheight", "ladder angel", "xyzzyq", "weed cuter boom", "hydralic presure 250", "round three of four", "t", "pwm", "sensor",
];
const ROUNDS = 12;
const WORDS = ["north", "upper", "spare", "rear", "aft", "port", "starboard", "inner", "outer", "second", "marsh", "quay", "basin", "weir", "culvert", "towpath"];

function varied(data: EntryData, number: number): EntryData {
  const words = [WORDS[number % 16], WORDS[(number * 7 + 3) % 16]].join(" ");
  return { ...data, name: `${data.name}, ${words} ${number % 97}`, partNumbers: data.partNumbers.map((part) => `${part}-${(number * 2654435761 % 2 ** 32).toString(36)}`) };
}

async function fill(db: Database, total: number, from: number): Promise<void> {
  const seeds = seedEntries();
  const now = new Date("2026-09-01T07:00:00Z");
  for (let number = from; number < total; number++) {
    const seed = seeds[number % seeds.length];
    if (!seed) throw new Error("no seed entries");
    const data = number < seeds.length ? seed.data : varied(seed.data, number);
    const id = String(number).padStart(26, "0");
    await db.batch([
      db.insert(entries).values({ id, slug: `entry-${number}`, currentVersionId: id, createdAt: now, retiredAt: null }),
      db.insert(entryVersions).values({ id, entryId: id, version: 1, publishedBy: "bench", publishedAt: now, ...versionColumns(data) }),
    ]);
  }
}

async function measure(title: string): Promise<void> {
  const times: { q: string; ms: number }[] = [];
  for (let round = 0; round <= ROUNDS; round++) {
    for (const q of QUERIES) {
      const start = performance.now();
      await search(readDb(), { q });
      // The first round warms up caches and the compiler.
      if (round > 0) times.push({ q, ms: performance.now() - start });
    }
  }
  const sorted = [...times].sort((a, b) => a.ms - b.ms);
  if (process.argv.includes("--each")) for (const q of QUERIES) process.stdout.write(`  "${q}" ${Math.min(...times.filter((t) => t.q === q).map((t) => t.ms)).toFixed(1)} ms at best\n`);
  const at = (share: number) => sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))]?.ms.toFixed(1);
  const slowest = sorted.at(-1);
  process.stdout.write(`${title}: ${times.length} queries, median ${at(0.5)} ms, p95 ${at(0.95)} ms, slowest ${slowest?.ms.toFixed(1)} ms ("${slowest?.q}")\n`);
}

await migrateDatabase();
if ((await readDb().$count(people)) > 0) throw new Error("DATABASE_URL must name a new database.");
await write(async (db) => {
  await db.insert(people).values({ id: "bench", email: "bench@canal-workshop.example", name: "Bench", passwordHash: "-", roles: [], createdAt: new Date(0) });
  await fill(db, seedEntries().length, 0);
});
await measure(`${seedEntries().length} entries`);
await write((db) => fill(db, 5000, seedEntries().length));
await measure("5,000 entries");
await closeDatabase();
