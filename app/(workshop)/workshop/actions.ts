"use server";

import { revalidatePath } from "next/cache";
import { action, type ActionResult } from "@/lib/action";
import { formOf } from "@/lib/form-values";
import { setDisabled } from "@/lib/people/set-disabled";
import { setRoles } from "@/lib/people/set-roles";

/** Give a person exactly the roles ticked. */
export async function setRolesAction(_previous: ActionResult<unknown> | null, form: FormData): Promise<ActionResult<unknown>> {
  const result = await action("people:manage", setRoles)({ personId: formOf(form).get("personId"), roles: formOf(form).getAll("roles") });
  revalidatePath("/workshop");
  return result;
}

/** Shut an account or open it again. */
export async function setDisabledAction(_previous: ActionResult<unknown> | null, form: FormData): Promise<ActionResult<unknown>> {
  const result = await action("people:manage", setDisabled)({ personId: formOf(form).get("personId"), disabled: formOf(form).get("disabled") === "yes" });
  revalidatePath("/workshop");
  return result;
}
