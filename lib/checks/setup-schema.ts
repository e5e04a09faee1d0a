import { z } from "zod";
import { connectorShapeSchema } from "@/lib/catalogue/schemas";
import { KINDS } from "@/lib/diagnosis";
import { experienceSchema } from "./confirm-schemas";
import { idSchema } from "./id-schemas";

const label = z.string().trim().min(1, "Each cavity needs its label.").max(8, "A cavity label has at most 8 letters.");
const name = z.string().max(120);
const pin = z.union([z.literal(1), z.literal(2), z.literal(3)]);
const share = z.number().min(0).max(1);
const volts = z.number().min(0).max(60, "Above 60 V d.c.: stop, not with this tool.");
const restFull = (value: z.ZodNumber) => z.strictObject({ rest: value, full: value });

const expectSchema = z.strictObject({
  kind: z.enum(KINDS),
  pins: z.strictObject({ supply: pin, ground: pin, signal: pin })
    .refine((p) => new Set([p.supply, p.ground, p.signal]).size === 3, "Supply, ground and signal are three different pins."),
  supplyVolts: z.union([volts, z.literal("battery")]),
  totalOhms: z.number().positive().max(1e8).optional(),
  tolerancePercent: z.number().min(0).max(100).optional(),
  signalRatio: restFull(share).optional(),
  wiperSeriesOhms: z.number().min(0).max(1e8).optional(),
  endOhms: z.number().min(0).max(1e8).optional(),
  output: z.enum(["open-collector", "push-pull"]).optional(),
  frequencyHz: z.number().positive().max(1e6).optional(),
  duty: restFull(share).optional(),
  signalVolts: restFull(volts).optional(),
});

const percent = z.number().min(0).max(50);
const meterSchema = z.strictObject({
  counts: z.number().int().min(1000).max(1_000_000),
  ohms: z.strictObject({ percent, counts: z.number().min(0).max(100), leadOhms: z.number().min(0).max(5), maxOhms: z.number().min(1e5).max(1e10) }),
  volts: z.strictObject({ percent, fixedVolts: z.number().min(0).max(1), inputOhms: z.number().min(1e5).max(1e12) }),
  hertz: z.strictObject({ percent }),
  duty: z.strictObject({ percent, fixed: share }),
  triggerVolts: z.number().min(0).max(10),
});

const colour = z.string().regex(/^[A-Z]{2}(\+?[A-Z]{2})*$/, "Wire colours are IEC 60757 letters, for example BK or GNYE.").max(12);

/** The parts of what is known before the first reading (RunSetup), each within sane bounds. */
export const SETUP_PARTS = {
  cavityLabels: z.tuple([label, label, label]).refine((labels) => new Set(labels).size === 3, "The three cavities need three different labels."),
  expect: expectSchema.optional(),
  entryId: idSchema.optional(),
  entryVersionId: idSchema.optional(),
  machineId: idSchema.optional(),
  machineName: name.optional(),
  entryName: name.optional(),
  meterId: idSchema.optional(),
  meter: meterSchema.optional(),
  connector: connectorShapeSchema.optional(),
  wireColours: z.tuple([colour.nullable(), colour.nullable(), colour.nullable()]).optional(),
  senses: z.string().max(120).optional(),
  batteryVolts: volts.optional(),
  recheckOf: idSchema.optional(),
  experience: experienceSchema.optional(),
  note: z.string().max(1000).optional(),
};
