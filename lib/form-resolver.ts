import type { FieldValues, Resolver } from "react-hook-form";
import type { $ZodType } from "zod/v4/core";

/**
 * A resolver that fetches its schema, and zod with it, when a form is first submitted: 33 KB that no page
 * loads at its start. The schema is the one that the server parses by.
 */
export function lazyResolver<V extends FieldValues>(load: () => Promise<$ZodType<V, V>>): Resolver<V> {
  return async (values, context, options) => {
    const [{ zodResolver }, schema] = await Promise.all([import("@hookform/resolvers/zod"), load()]);
    return zodResolver(schema)(values, context, options);
  };
}
