import type { z } from "zod";
import { AppError } from "./errors";

/**
 * Parse input by the schema shared with the form.
 * @throws AppError invalid-input (400) naming every field at fault.
 */
export function parseInput<S extends z.ZodType>(schema: S, input: unknown): z.output<S> {
  const parsed = schema.safeParse(input);
  if (parsed.success) return parsed.data;
  const fields: Record<string, string> = {};
  for (const issue of parsed.error.issues) fields[issue.path.join(".") || "input"] ??= issue.message;
  const [first] = Object.entries(fields);
  throw new AppError("invalid-input", first ? `${first[0]}: ${first[1]}` : "The input cannot be read.", 400, first?.[0], fields);
}
