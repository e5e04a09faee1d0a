import { createClient } from "@libsql/client";
import { eq, sql } from "drizzle-orm";
import { ulid } from "ulid";
import { describe, expect, it } from "vitest";
import { closeDatabase, readDb, transact, write } from "@/db/client";
import { auditRows, people, rateLimits, sessions } from "@/db/schema";
import { WriteQueue } from "@/db/write-queue";
import { env } from "@/lib/env";
import { eachTestOwnDatabase } from "../support/database";
import { makePerson } from "../support/people";

eachTestOwnDatabase();

const row = (at: number) => ({ key: `key-${at}`, points: 0, expiresAt: new Date(0) });
const bump = (key: string) => ({ where: eq(rateLimits.key, key), set: { points: sql`${rateLimits.points} + 1` } });

describe("the write queue", () => {
  it("carries 2,400 mixed operations started at once without one error or lost write", async () => {
    await write((db) => db.insert(rateLimits).values(Array.from({ length: 10 }, (_, at) => row(at))));
    const failed: unknown[] = [];
    const operations = Array.from({ length: 2400 }, (_, at): Promise<unknown> => {
      const { where, set } = bump(`key-${at % 10}`);
      if (at % 4 === 0) return write((db) => db.update(rateLimits).set(set).where(where));
      if (at % 4 === 1) return transact(async (tx) => { await tx.select().from(rateLimits); await tx.update(rateLimits).set(set).where(where); });
      if (at % 4 === 2) return write((db) => db.batch([db.update(rateLimits).set(set).where(where), db.select().from(rateLimits)]));
      return readDb().select().from(rateLimits);
    });
    await Promise.all(operations.map((operation) => operation.catch((error: unknown) => failed.push(error))));
    expect(failed).toEqual([]);
    const [total] = await readDb().select({ points: sql<number>`sum(${rateLimits.points})` }).from(rateLimits);
    expect(total?.points).toBe(1800);
  });

  it("rolls a failed transaction back whole and goes on with the next", async () => {
    const bad = transact(async (tx) => {
      await tx.insert(rateLimits).values(row(1));
      throw new Error("half way");
    });
    const good = write((db) => db.insert(rateLimits).values(row(2)));
    await expect(bad).rejects.toThrow("half way");
    await good;
    expect((await readDb().select().from(rateLimits)).map(({ key }) => key)).toEqual(["key-2"]);
  });

  it("keeps to synchronous=FULL and foreign keys, also after transactions", async () => {
    await transact((tx) => tx.insert(rateLimits).values(row(1)));
    expect(await write((db) => db.get<{ synchronous: number }>(sql`PRAGMA synchronous`))).toMatchObject({ synchronous: 2 });
    const orphan = { id: ulid(), personId: "nobody", userAgent: "", createdAt: new Date(), lastSeenAt: new Date(), expiresAt: new Date() };
    await expect(write((db) => db.insert(sessions).values(orphan))).rejects.toThrow();
    expect(await readDb().$count(sessions)).toBe(0);
  });

  it("sees what was just written through the reading connection", async () => {
    const person = await makePerson();
    await write((db) => db.update(people).set({ name: "Renamed" }).where(eq(people.id, person.id)));
    expect(await readDb().select({ name: people.name }).from(people)).toEqual([{ name: "Renamed" }]);
    expect(await readDb().$count(auditRows)).toBe(0);
  });

  it("outlives another process that holds the database: no write is lost or reported done in vain", async () => {
    await write((db) => db.insert(rateLimits).values(row(1)));
    const other = createClient({ url: env().databaseUrl });
    const lock = await other.transaction("write");
    // Due while the writer waits out its five seconds; runs when it gives up for the first time.
    setTimeout(() => void lock.commit(), 50);
    await write((db) => db.insert(rateLimits).values(row(2)));
    await write((db) => db.insert(rateLimits).values(row(3)));
    other.close();
    await closeDatabase();
    expect((await readDb().select().from(rateLimits)).map(({ key }) => key)).toEqual(["key-1", "key-2", "key-3"]);
  });

  it("refuses to wait for itself", async () => {
    await expect(write(() => write(async () => 1))).rejects.toThrow("inside write()");
  });

  it("runs tasks one at a time and in order", async () => {
    const queue = new WriteQueue();
    const trace: string[] = [];
    const task = (name: string, ms: number) => queue.run(async () => {
      trace.push(`${name} starts`);
      await new Promise((resolve) => setTimeout(resolve, ms));
      trace.push(`${name} ends`);
    });
    await Promise.all([task("a", 15), task("b", 1), task("c", 5)]);
    expect(trace).toEqual(["a starts", "a ends", "b starts", "b ends", "c starts", "c ends"]);
  });
});
