"use server";

import { revalidatePath } from "next/cache";
import { action, type ActionResult } from "@/lib/action";
import { withdrawConfirmation } from "@/lib/checks/withdraw-confirmation";
import { formOf } from "@/lib/form-values";

/** Take the confirmation in the form back. */
export async function withdrawAction(_last: ActionResult<unknown> | null, form: FormData): Promise<ActionResult<unknown>> {
  const result = await action("check:confirm", withdrawConfirmation)({ confirmationId: formOf(form).get("confirmationId") });
  if (result.ok) revalidatePath(`/checks/${result.data.checkId}`);
  revalidatePath("/checks/chances");
  return result;
}
