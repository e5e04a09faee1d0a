import { z } from "zod";

const id = z.string().regex(/^[0-9A-Za-z][0-9A-Za-z_-]{0,63}$/, "Not an id.");

/** Words to find machines by; empty lists all. */
export const listMachinesSchema = z.strictObject({ q: z.string().max(200).default("") });

export const getMachineSchema = z.strictObject({ id });

export const listMachineChecksSchema = z.strictObject({ id, limit: z.int().min(1).max(50).default(6) });
