"use server";

import { revalidatePath } from "next/cache";
import { action, type ActionResult } from "@/lib/action";
import { confirmCheck } from "@/lib/checks/confirm-check";
import { formOf } from "@/lib/form-values";

interface ConfirmState { readonly result: ActionResult<unknown>; readonly given: { readonly finding: string; readonly kind: string; readonly proof: string } }

const text = (form: unknown, name: string): string => {
  const value = formOf(form).get(name);
  return typeof value === "string" ? value : "";
};

/** Record what the check in the form turned out to be. */
export async function confirmAction(_last: ConfirmState | null, form: FormData): Promise<ConfirmState> {
  const id = text(form, "check");
  const given = { finding: text(form, "finding"), kind: text(form, "kind"), proof: text(form, "proof") };
  const result = await action("check:confirm", (person, input) => confirmCheck(person, id, input))(given);
  if (result.ok) revalidatePath(`/checks/${encodeURIComponent(id)}`);
  return { result, given };
}
