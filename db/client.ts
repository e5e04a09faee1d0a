import "server-only";
import { mkdirSync } from "node:fs";
import path from "node:path";
import { createClient, type Client, type ResultSet } from "@libsql/client";
import { drizzle, type LibSQLDatabase } from "drizzle-orm/libsql";
import type { BaseSQLiteDatabase } from "drizzle-orm/sqlite-core";
import { env } from "@/lib/env";
import * as schema from "./schema";
import { WriteQueue } from "./write-queue";

export type Database = LibSQLDatabase<typeof schema>;
/** A database or a transaction: what a helper of a write takes. */
export type Writer = BaseSQLiteDatabase<"async", ResultSet, typeof schema>;
/** Reading only; databases and transactions both fit. */
export type Reader = Pick<Writer, "select" | "selectDistinct" | "$count" | "all" | "get" | "values" | "with" | "$with">;

interface Clients {
  readonly url: string;
  readonly reader: Client;
  readonly writer: Client;
  readonly readDb: Database;
  readonly writeDb: Database;
  readonly queue: WriteQueue;
  readonly ready: Promise<void>;
}

// On globalThis: Next loads modules more than once, and two write queues would be no queue.
const holder = globalThis as { pinwrightClients?: Clients };

const isFile = (url: string) => url.startsWith("file:");

function makeFolder(url: string): void {
  const file = url.slice("file:".length).replace(/^\/\/(?=\/)/, "").replace(/\?.*$/, "");
  mkdirSync(path.dirname(path.resolve(/* turbopackIgnore: true */ process.cwd(), file)), { recursive: true });
}

/** WAL stays in the file; the others belong to a connection and are set again whenever there is a new one. */
async function setPragmas(client: Client): Promise<void> {
  await client.execute("PRAGMA journal_mode = WAL");
  await client.execute("PRAGMA synchronous = FULL");
  await client.execute("PRAGMA foreign_keys = ON");
  if (!(await pragmasHold(client))) throw new Error("The database refuses synchronous=FULL or foreign keys.");
}

async function pragmasHold(client: Client): Promise<boolean> {
  const synchronous = await client.execute("PRAGMA synchronous");
  const foreignKeys = await client.execute("PRAGMA foreign_keys");
  return synchronous.rows[0]?.[0] === 2 && foreignKeys.rows[0]?.[0] === 1;
}

function open(): Clients {
  const { databaseUrl: url, databaseAuthToken: authToken } = env();
  if (isFile(url)) makeFolder(url);
  const writer = createClient({ url, authToken, concurrency: 1, timeout: 5000 });
  const reader = createClient({ url, authToken, timeout: 5000 });
  const ready = isFile(url) ? setPragmas(writer) : Promise.resolve();
  // Seen by whoever writes first; a rejection without a listener would end the process.
  ready.catch(() => undefined);
  return { url, reader, writer, readDb: drizzle(reader, { schema }), writeDb: drizzle(writer, { schema }), queue: new WriteQueue(), ready };
}

function clients(): Clients {
  holder.pinwrightClients ??= open();
  return holder.pinwrightClients;
}

/** For reading; opened on first use. */
export function readDb(): Reader {
  return clients().readDb;
}

function isBusy(error: unknown): boolean {
  for (let at = error; at instanceof Error; at = at.cause) {
    const { code, extendedCode } = at as { code?: unknown; extendedCode?: unknown };
    if ([code, extendedCode].some((text) => typeof text === "string" && text.startsWith("SQLITE_BUSY"))) return true;
  }
  return false;
}

const RETRIES = 3;
const PAUSE_MS = 100;

/** One SQLITE_BUSY poisons the connection, so it is thrown away before the task runs again. */
async function attempt<T>(own: Clients, task: (db: Database) => Promise<T>, left: number): Promise<T> {
  try {
    await own.ready;
    if (isFile(own.url) && !(await pragmasHold(own.writer))) await setPragmas(own.writer);
    return await task(own.writeDb);
  } catch (error) {
    if (left === 0 || !isBusy(error)) throw error;
    // A pause of the event loop, not only of this promise: whoever holds the lock may be in this process.
    await new Promise((resolve) => setTimeout(resolve, PAUSE_MS));
    await own.writer.reconnect();
    await setPragmas(own.writer);
    return attempt(own, task, left - 1);
  }
}

/**
 * The only way to write: one task at a time on one connection. Tasks whose parts belong together use
 * `db.batch([...])` or `db.transaction(...)`; a task is run again when the database was busy.
 */
export function write<T>(task: (db: Database) => Promise<T>): Promise<T> {
  const own = clients();
  return own.queue.run(() => attempt(own, task, RETRIES));
}

/** A write in one transaction: all of it or nothing. */
export function transact<T>(task: (tx: Writer) => Promise<T>): Promise<T> {
  return write((db) => db.transaction((tx) => task(tx)));
}

/** Finish what is queued, close both connections and forget them. */
export async function closeDatabase(): Promise<void> {
  const own = holder.pinwrightClients;
  if (!own) return;
  await own.queue.run(async () => undefined);
  delete holder.pinwrightClients;
  own.writer.close();
  own.reader.close();
}
