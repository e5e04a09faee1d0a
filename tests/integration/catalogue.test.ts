import { and, eq } from "drizzle-orm";
import { beforeEach, describe, expect, it } from "vitest";
import { readDb, write } from "@/db/client";
import { auditRows, entries, entryVersions } from "@/db/schema";
import type { Person } from "@/lib/auth/permissions";
import type { EntryData } from "@/lib/catalogue/entry-data";
import { getEntry } from "@/lib/catalogue/get-entry";
import { publishEntry } from "@/lib/catalogue/publish-entry";
import { searchEntries } from "@/lib/catalogue/search-entries";
import { seedCatalogue, seedEntries } from "@/seed/catalogue";
import { eachTestOwnDatabase } from "../support/database";
import { makePerson } from "../support/people";

eachTestOwnDatabase();

let editor: Person;
let technician: Person;

beforeEach(async () => {
  editor = await makePerson(["editor"], "Ed Itor");
  technician = await makePerson(["technician"]);
  await write(seedCatalogue);
});

const firstSeed = () => {
  const [seed] = seedEntries();
  if (!seed) throw new Error("no seed entries");
  return seed;
};

async function namesOf(q: string, more: Record<string, unknown> = {}): Promise<string[]> {
  return (await searchEntries(technician, { q, ...more })).hits.map((hit) => hit.name);
}

describe("search as typed", () => {
  // Query as people type it, and the entry that must come first.
  it.each([
    ["AMI 4-210 B", "Bucket-ladder angle sensor, 45 degrees"],
    ["ami4210b", "Bucket-ladder angle sensor, 45 degrees"],
    ["AMI-4 210/B", "Bucket-ladder angle sensor, 45 degrees"],
    ["bhw330712", "Rear hitch position sensor"],
    ["BHW/3307/12", "Rear hitch position sensor"],
    ["ami 4216 c", "Bucket-ladder angle sensor, 60 degrees"],
    ["tarctor throtle", "Hand throttle lever, tractor"],
    ["hydralic presure 250", "Hydraulic pressure sensor, 250 bar"],
    ["weed cuter boom", "Weed-cutter boom height sensor"],
    ["hweed cutter boom", "Weed-cutter boom height sensor"],
    ["boomheight", "Weed-cutter boom height sensor"],
    ["ladder angel stern", "Stern-ladder angle sensor"],
  ])("%s", async (q, first) => {
    expect((await namesOf(q))[0]).toBe(first);
  });

  it("takes wire colours as letters or as words, in any order", async () => {
    const wanted = seedEntries().filter(({ data }) => ["BN", "BU", "BK"].every((code) => data.pins.some((pin) => pin.colour === code))).length;
    expect(wanted).toBeGreaterThan(3);
    for (const q of ["BN/BU/BK", "bk bn bu", "brown blue black", "black, blue and brown wires"]) {
      const result = await searchEntries(technician, { q: q.replace(" and", "") });
      expect([q, result.total]).toEqual([q, wanted]);
    }
  });

  it("answers one and two letters by the starts of words", async () => {
    const result = await searchEntries(technician, { q: "iv" });
    expect(new Set(result.hits.map((hit) => hit.maker))).toEqual(new Set(["Ivelbrook Hydraulics"]));
    expect((await searchEntries(technician, { q: "5v", supply: ["5"] })).total).toBe(seedEntries().filter(({ data }) => data.supply.type === "fixed" && data.supply.volts === 5).length);
  });

  it("says which words stood in for a misspelling, and when no entry has all words", async () => {
    expect((await searchEntries(technician, { q: "tarctor" })).corrected).toEqual([{ typed: "tarctor", used: ["tractor"] }]);
    const some = await searchEntries(technician, { q: "ladder pedal" });
    expect(some.relaxed).toBe(true);
    expect(some.total).toBeGreaterThan(0);
    expect(await namesOf("qqqqxxxx")).toEqual([]);
  });

  it("narrows by facets and counts what each value would leave", async () => {
    const all = await searchEntries(technician, {});
    const pwm = await searchEntries(technician, { kind: ["pwm"] });
    expect(all.total).toBe(seedEntries().length);
    expect(pwm.total).toBe(all.facets.find((group) => group.facet === "kind")?.options.find((option) => option.value === "pwm")?.count);
    const kinds = pwm.facets.find((group) => group.facet === "kind")?.options ?? [];
    expect(kinds.map((option) => [option.value, option.chosen])).toEqual([["potentiometer", false], ["pwm", true], ["voltage", false]]);
    expect(kinds.every((option) => option.count > 0)).toBe(true);
    const both = await searchEntries(technician, { kind: ["pwm", "voltage"], colour: ["TQ"] });
    expect(both.hits.every((hit) => hit.kind !== "potentiometer" && hit.pins.some((pin) => pin.colour === "TQ"))).toBe(true);
    expect(both.total).toBeGreaterThan(0);
  });

  it("pages without losing or repeating an entry", async () => {
    const { pages } = await searchEntries(technician, {});
    const slugs: string[] = [];
    for (let page = 1; page <= pages; page++) slugs.push(...(await searchEntries(technician, { page })).hits.map((hit) => hit.slug));
    expect(new Set(slugs)).toEqual(new Set(seedEntries().map((entry) => entry.slug)));
    expect(slugs.length).toBe(seedEntries().length);
    expect((await searchEntries(technician, { page: 999 })).page).toBe(pages);
  });

  it.each(["\"", "a\"b", "* OR *", "AND NOT (", "'; DROP TABLE entries; --", "NEAR(a b)", "\u0000", "Ω±", "-", "%", "x".repeat(200)])("takes %j as words, not as a query language", async (q) => {
    await expect(searchEntries(technician, { q })).resolves.toMatchObject({ q });
  });

  it("refuses what it does not know, by a code", async () => {
    await expect(searchEntries(technician, { q: 5 })).rejects.toMatchObject({ code: "invalid-input", status: 400 });
    await expect(searchEntries(technician, { q: "x".repeat(201) })).rejects.toMatchObject({ code: "invalid-input" });
    await expect(searchEntries(technician, { colour: "BN", page: 0 })).rejects.toMatchObject({ code: "invalid-input" });
    await expect(searchEntries(technician, { q: "", sort: "name" })).rejects.toMatchObject({ code: "invalid-input" });
  });
});

describe("publishing", () => {
  const renamed = (data: EntryData, name: string): EntryData => ({ ...data, name });

  it("adds a version, keeps the older one as it was, and the search follows", async () => {
    const { slug, data } = firstSeed();
    const published = await publishEntry(editor, { slug, basedOn: 1, data: renamed(data, "Zephyrine angle sensor") });
    expect(published.version).toBe(2);
    expect(await namesOf("zephyrine")).toEqual(["Zephyrine angle sensor"]);
    expect(await namesOf("AMI 4-210 B")).toEqual(["Zephyrine angle sensor"]);
    expect(await getEntry(technician, { slug })).toMatchObject({ version: 2, shownVersion: 2, publishedBy: "Ed Itor" });
    expect(await getEntry(technician, { slug, version: 1 })).toMatchObject({ version: 1, shownVersion: 2, data: { name: data.name } });
    const audit = await readDb().select().from(auditRows).where(and(eq(auditRows.verb, "entry:publish"), eq(auditRows.subjectId, published.entryId)));
    expect(audit).toMatchObject([{ personId: editor.id, detail: { slug, version: 2 } }]);
  });

  it("makes a new entry that is found at once, and none that is retired", async () => {
    const { data } = firstSeed();
    const published = await publishEntry(editor, { slug: "quillon-sensor", basedOn: 0, data: { ...renamed(data, "Quillon sensor"), partNumbers: ["QX 1-1"] } });
    expect(await namesOf("quillon")).toEqual(["Quillon sensor"]);
    await write((db) => db.update(entries).set({ retiredAt: new Date() }).where(eq(entries.id, published.entryId)));
    expect(await namesOf("quillon")).toEqual([]);
    await expect(publishEntry(editor, { slug: "quillon-sensor", basedOn: 1, data })).rejects.toMatchObject({ code: "entry-retired", status: 409 });
  });

  it("refuses a version made from one that is no longer shown", async () => {
    const { slug, data } = firstSeed();
    await publishEntry(editor, { slug, basedOn: 1, data });
    await expect(publishEntry(editor, { slug, basedOn: 1, data })).rejects.toMatchObject({ code: "entry-changed", status: 409 });
    await expect(publishEntry(editor, { slug, basedOn: 0, data })).rejects.toMatchObject({ code: "entry-changed" });
  });

  it("refuses who may not publish, and data that contradicts itself, and changes nothing", async () => {
    const { slug, data } = firstSeed();
    const versions = () => readDb().$count(entryVersions);
    const before = await versions();
    await expect(publishEntry(technician, { slug, basedOn: 1, data })).rejects.toMatchObject({ code: "not-allowed", status: 403 });
    const swapped = { ...data, pins: data.pins.map((pin) => ({ ...pin, cavity: "9" })) };
    await expect(publishEntry(editor, { slug, basedOn: 1, data: swapped })).rejects.toMatchObject({ code: "invalid-input", status: 400, fields: { "data.pins.0.cavity": expect.stringContaining("no cavity 9") } });
    await expect(publishEntry(editor, { slug: "Not A Slug", basedOn: 0, data })).rejects.toMatchObject({ code: "invalid-input" });
    expect(await versions()).toBe(before);
  });

  it("answers unknown and malformed slugs by code", async () => {
    await expect(getEntry(technician, { slug: "no-such-entry" })).rejects.toMatchObject({ code: "not-found", status: 404 });
    await expect(getEntry(technician, { slug: firstSeed().slug, version: 7 })).rejects.toMatchObject({ code: "not-found" });
    await expect(getEntry(technician, { slug: "../etc" })).rejects.toMatchObject({ code: "invalid-input", status: 400 });
  });
});
