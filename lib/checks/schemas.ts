import { z } from "zod";
import { FAULT_CODES, KINDS, OTHER_DEVICES, WIRE_COLOURS, type FaultMessage } from "@/lib/diagnosis";
import { experienceSchema } from "./confirm-schemas";
import { idSchema, ulidSchema } from "./id-schemas";
import { SKIP_REASONS } from "./run";
import { SETUP_PARTS } from "./setup-schema";

/** Most steps of one check, and most bytes they may take together. */
export const MAX_STEPS = 400;
export const MAX_STEP_BYTES = 64 * 1024;

const faultMessageSchema = z.custom<FaultMessage>((value) => typeof value === "string" && /^FMI (\d|[12]\d|3[01])$/.test(value));

export const readingValueSchema = z.union([
  z.number(), z.enum(["OL", "none", "smooth", "jumps", "still", "grips", "loose", ...WIRE_COLOURS]), faultMessageSchema,
], "A reading is a number, or one of the words that the check takes.");

const checkCodeSchema = z.string().max(40);
const stepBase = { id: ulidSchema, at: z.iso.datetime({ offset: true }) };

export const stepSchema = z.discriminatedUnion("type", [
  z.strictObject({ ...stepBase, type: z.literal("reading"), check: checkCodeSchema, value: readingValueSchema, typed: z.string().max(40) }),
  z.strictObject({ ...stepBase, type: z.literal("skip"), check: checkCodeSchema, reason: z.enum(SKIP_REASONS), note: z.string().max(300).optional() }),
  z.strictObject({ ...stepBase, type: z.literal("state"), deviceParted: z.boolean(), controllerParted: z.boolean(), powerOn: z.boolean() }),
  z.strictObject({ ...stepBase, type: z.literal("retract"), step: ulidSchema }),
]);

export const setupSchema = z.strictObject(SETUP_PARTS);

export const startCheckSchema = z.strictObject({
  id: ulidSchema, setup: setupSchema,
  /** When the phone began; it may have been without a server for days. */
  startedAt: z.iso.datetime({ offset: true }).optional(),
});
export const appendStepsSchema = z.strictObject({ steps: z.array(stepSchema).min(1).max(MAX_STEPS) });

const chance = z.number().min(0).max(1);
const pinSchema = z.union([z.literal(1), z.literal(2), z.literal(3)]);
const faultSchema = z.object({ code: z.enum(FAULT_CODES), pins: z.array(pinSchema).max(3).optional(), p: chance });

/** What of a standing decides a verdict; the rest of an assessment is left out here and not compared. */
export const standingSchema = z.object({
  state: z.string().max(40),
  kinds: z.array(z.object({ kind: z.enum(KINDS), p: chance })).max(10),
  others: z.array(z.object({ device: z.enum(OTHER_DEVICES), p: chance })).max(10).default([]),
  pins: z.array(z.object({ supply: pinSchema, ground: pinSchema, signal: pinSchema, p: chance })).max(6),
  faults: z.array(faultSchema).max(200),
  openFindings: z.array(faultSchema).max(200),
  done: z.boolean(),
  inseparable: z.boolean(),
});
export type ComparedStanding = z.infer<typeof standingSchema>;

/** The phone's own standing at the end, where it has one, to be compared with the server's, and the own checks it counted in. */
export const finishCheckSchema = z.strictObject({ standing: standingSchema.optional(), experience: experienceSchema.optional() });

export const attachMachineSchema = z.strictObject({ machineId: idSchema });
export const startRecheckSchema = z.strictObject({ id: ulidSchema });

const emptyIsAbsent = <T extends z.ZodType>(schema: T) => z.preprocess((value) => (value === "" ? undefined : value), schema.optional());
const dateSchema = z.iso.date("A date looks like 2026-03-31.");

/** A place in the log: the last row seen, as "<milliseconds>.<id>". */
const cursorSchema = z.string().regex(/^\d{1,15}\.[0-9A-Za-z_-]{1,64}$/, "Not a place in the log.");

/** Filters of the log, straight from the address: an empty field means "any". */
export const listChecksSchema = z.object({
  machine: emptyIsAbsent(idSchema),
  entry: emptyIsAbsent(idSchema),
  person: emptyIsAbsent(idSchema),
  kind: emptyIsAbsent(z.enum(KINDS, "There is no such kind. Choose one from the list.")),
  finding: emptyIsAbsent(z.enum(FAULT_CODES, "There is no such finding. Choose one from the list.")),
  state: emptyIsAbsent(z.enum(["running", "finished", "abandoned"], "There is no such state. Choose one from the list.")),
  from: emptyIsAbsent(dateSchema),
  to: emptyIsAbsent(dateSchema),
  after: emptyIsAbsent(cursorSchema),
  limit: emptyIsAbsent(z.coerce.number("A page holds 1 to 100 checks.").int().min(1).max(100)),
});
export type ListChecksFilters = z.infer<typeof listChecksSchema>;
