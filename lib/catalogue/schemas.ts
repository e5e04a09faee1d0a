import { z } from "zod";
import { KINDS, ROLES } from "@/lib/diagnosis";
import { coherenceProblems } from "./entry-coherence";
import type { EntryData } from "./entry-data";

const line = (max: number) => z.string().trim().min(1).max(max);
const label = z.string().regex(/^[A-Z0-9]{1,3}$/i, "A cavity label is one to three letters or digits.");
const share = z.number().min(0).max(1);
const restFull = <T extends z.ZodType<number>>(number: T) => z.strictObject({ rest: number, full: number });

const cavity = z.strictObject({ label, row: z.number().min(0).max(12), column: z.number().min(0).max(12) });

/** A connector's face; labels and places are compared in `entryDataSchema`. */
export const connectorShapeSchema = z.strictObject({
  id: z.string().regex(/^[a-z0-9-]{1,60}$/),
  name: line(80),
  outline: z.enum(["rectangle", "rounded", "round", "triangle"]),
  cavities: z.array(cavity).min(3).max(24),
  keying: z.array(z.strictObject({ side: z.enum(["top", "right", "bottom", "left"]), at: share, width: z.number().positive().max(4), type: z.enum(["rib", "slot"]) })).max(8),
  latch: z.enum(["top", "bottom", "left", "right", "none"]),
  gender: z.enum(["plug", "receptacle"]),
});

const pin = z.strictObject({ role: z.enum(ROLES), cavity: label, colour: z.string().regex(/^[A-Z]{2,8}$/), gaugeMm2: z.number().min(0.1).max(25) });

const healthy = z.strictObject({
  totalOhms: z.number().positive().max(1e7).optional(),
  tolerancePercent: z.number().positive().max(50).optional(),
  wiperSeriesOhms: z.number().min(0).max(1e6).optional(),
  signalRatio: restFull(share).optional(),
  signalVolts: restFull(z.number().min(0).max(60)).optional(),
  duty: restFull(share).optional(),
  frequencyHz: z.number().positive().max(100_000).optional(),
  output: z.enum(["open-collector", "push-pull"]).optional(),
  pullUpNeeded: z.boolean().optional(),
});

const supply = z.discriminatedUnion("type", [
  z.strictObject({ type: z.literal("fixed"), volts: z.number().positive().max(60) }),
  z.strictObject({ type: z.literal("battery"), minVolts: z.number().positive().max(60), maxVolts: z.number().positive().max(60) }),
]);

const quantity = z.strictObject({ name: line(60), unit: line(20) });

const transfer = z.strictObject({
  signal: quantity,
  value: quantity,
  points: z.array(z.strictObject({ signal: z.number(), value: z.number() })).min(2).max(60),
});

const source = z.strictObject({ title: line(200), reference: line(200), date: z.iso.date() });

/** The whole content of an entry's version, checked for shape and for coherence. */
export const entryDataSchema: z.ZodType<EntryData> = z.strictObject({
  name: line(120),
  maker: line(80),
  partNumbers: z.array(line(40)).min(1).max(12),
  kind: z.enum(KINDS),
  senses: line(60),
  movement: line(200),
  supply,
  pins: z.array(pin).length(3),
  connector: connectorShapeSchema,
  healthy,
  transfer,
  cautions: z.array(line(400)).max(12),
  sources: z.array(source).min(1).max(20),
}).superRefine((data, context) => {
  for (const problem of coherenceProblems(data)) context.addIssue({ code: "custom", path: [...problem.path], message: problem.message });
});

/** A catalogue slug: ASCII kebab-case. */
export const slugSchema = z.string().regex(/^[a-z0-9]+(?:-[a-z0-9]+)*$/).max(120);

/** An entry to read: by slug, a version's number when not the one shown. */
export const getEntrySchema = z.strictObject({ slug: slugSchema, version: z.int().min(1).max(100_000).optional() });

/** A new version of an entry, made from version `basedOn`; 0 for the first version of a new entry. */
export const publishEntrySchema = z.strictObject({ slug: slugSchema, basedOn: z.int().min(0).max(100_000), data: entryDataSchema });

export const FACETS = ["kind", "quantity", "connector", "supply", "colour"] as const;
export type Facet = (typeof FACETS)[number];

const chosen = z.array(z.string().min(1).max(80)).max(20).default([]);

/** A search as typed, with chosen facet values and the page wanted (from 1). */
export const searchEntriesSchema = z.strictObject({
  q: z.string().max(200).default(""),
  kind: chosen, quantity: chosen, connector: chosen, supply: chosen, colour: chosen,
  page: z.coerce.number().int().min(1).max(1000).default(1),
});

export type SearchInput = z.infer<typeof searchEntriesSchema>;
