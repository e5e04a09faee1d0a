import { openDB, type DBSchema, type IDBPDatabase } from "idb";
import type { RunRecord, StepRecord } from "./records";

interface PhoneSchema extends DBSchema {
  runs: { key: string; value: RunRecord; indexes: { person: string } };
  steps: { key: string; value: StepRecord; indexes: { run: string } };
}

export type PhoneDatabase = IDBPDatabase<PhoneSchema>;

let opening: Promise<PhoneDatabase> | null = null;

/** The phone's own database. Rejects where the browser keeps nothing (storage blocked); the next call tries again. */
export function phoneDatabase(): Promise<PhoneDatabase> {
  opening ??= openDB<PhoneSchema>("pinwright", 1, {
    upgrade(database) {
      database.createObjectStore("runs", { keyPath: "id" }).createIndex("person", "personId");
      database.createObjectStore("steps", { keyPath: "id" }).createIndex("run", "runId");
    },
    terminated() { opening = null; },
  }).catch((error: unknown) => {
    opening = null;
    throw error;
  });
  return opening;
}
