"use server";

import { revalidatePath } from "next/cache";
import { action, type ActionResult } from "@/lib/action";
import { switchExperience } from "@/lib/checks/switch-experience";
import { formOf } from "@/lib/form-values";

/** Set own checks aside, or count them again. */
export async function switchAction(_last: ActionResult<unknown> | null, form: FormData): Promise<ActionResult<unknown>> {
  const wanted = formOf(form).get("inUse");
  const result = await action("experience:switch", switchExperience)({ inUse: wanted === "yes" ? true : wanted === "no" ? false : undefined });
  revalidatePath("/checks/chances");
  return result;
}
