import { z } from "zod";
import { ROLES } from "@/lib/auth/permissions";

/** Ids are ULIDs. */
const id = z.string("The id is missing.").regex(/^[0-9A-HJKMNP-TV-Z]{26}$/, "That is not an id.");

export const revokeSessionSchema = z.strictObject({ sessionId: id });

export const setRolesSchema = z.strictObject({
  personId: id,
  roles: z.array(z.enum(ROLES, "There is no such role."), "Give a list of roles.").min(1, "Give at least one role. To shut somebody out, disable the account.").max(ROLES.length, "That is more roles than there are."),
});

export const setDisabledSchema = z.strictObject({ personId: id, disabled: z.boolean("Say whether the account is disabled.") });

export const setThemeSchema = z.strictObject({ theme: z.enum(["day", "night"], "Choose day or night.") });
