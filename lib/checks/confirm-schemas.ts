import { z } from "zod";
import { KINDS, FAULT_CODES } from "@/lib/diagnosis";
import { idSchema } from "./id-schemas";
import { outcomeOf } from "./outcome-choices";

/** The bound is far above what any workshop confirms, and far below where whole numbers lose digits. */
const count = z.number().int("Counts are whole numbers.").min(0).max(1_000_000);

/** Counts of the workshop's own confirmed checks, as a check carries them: known codes, bounded whole numbers. */
export const experienceSchema = z.strictObject({
  kinds: z.partialRecord(z.enum(KINDS), count),
  findings: z.partialRecord(z.enum(FAULT_CODES), count),
});

const finding = z.string("Choose what it was.").max(40).transform((id, context) => {
  const fault = outcomeOf(id);
  if (fault) return fault;
  context.addIssue({ code: "custom", message: "Choose what it was, from the list." });
  return z.NEVER;
});

/** What a check turned out to be: the finding with its place as one text ("wire-open:2"), the kind, and the proof. */
export const confirmCheckSchema = z.strictObject({
  finding,
  kind: z.enum(KINDS, "Choose the kind of device."),
  proof: z.string("Say how it was proved.").trim().min(10, "Say how it was proved, in a few words.").max(500, "Keep the proof under 500 letters."),
});

export const withdrawSchema = z.strictObject({ confirmationId: idSchema });

export const switchExperienceSchema = z.strictObject({ inUse: z.boolean("Say whether own checks count.") });

/** A place in the list of confirmations: the last one seen. */
export const listConfirmationsSchema = z.object({ before: idSchema.optional() });
