import { closeDatabase, readDb, transact, type Writer } from "@/db/client";
import { migrateDatabase } from "@/db/migrate";
import { checks, confirmations, entries, machines, people } from "@/db/schema";
import { env } from "@/lib/env";
import { seedCatalogue } from "./catalogue";
import { seedChecks } from "./checks";
import { seedConfirmations } from "./checks/confirmations";
import { seedMachines } from "./machines";
import { DEMO_PASSWORD, DEMO_PEOPLE, seedPeople } from "./people";

interface Part { readonly name: string; readonly isEmpty: () => Promise<boolean>; readonly seed: (tx: Writer) => Promise<void> }

/** In this order: each part points at rows of the ones before it. */
const PARTS: readonly Part[] = [
  { name: "people", isEmpty: async () => (await readDb().$count(people)) === 0, seed: seedPeople },
  { name: "machines and meters", isEmpty: async () => (await readDb().$count(machines)) === 0, seed: seedMachines },
  { name: "catalogue", isEmpty: async () => (await readDb().$count(entries)) === 0, seed: seedCatalogue },
  { name: "checks", isEmpty: async () => (await readDb().$count(checks)) === 0, seed: seedChecks },
  { name: "confirmations", isEmpty: async () => (await readDb().$count(confirmations)) === 0, seed: seedConfirmations },
];

/** Fill what is empty with the demo workshop; what holds anything is left alone. */
async function seedDatabase(): Promise<void> {
  if (env().production) {
    process.stdout.write("Production: no demo data. Set FIRST_ADMIN_EMAIL and FIRST_ADMIN_PASSWORD to get the first administrator.\n");
    return;
  }
  for (const { name, isEmpty, seed } of PARTS) {
    if (!(await isEmpty())) continue;
    // All of a part or nothing: a run that was interrupted is simply run again.
    await transact(seed);
    process.stdout.write(`Demo data: ${name}\n`);
  }
}

function printAccounts(): void {
  const rows = DEMO_PEOPLE.map((person) => `  ${person.email.padEnd(32)} ${person.roles.join(", ")}`);
  process.stdout.write(`Demo accounts (password for all: ${DEMO_PASSWORD})\n${rows.join("\n")}\n`);
}

await migrateDatabase();
await seedDatabase();
if (process.argv.includes("--accounts") && !env().production) printAccounts();
await closeDatabase();
