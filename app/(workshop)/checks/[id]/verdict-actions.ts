"use server";

import type { Route } from "next";
import { revalidatePath } from "next/cache";
import { redirect } from "next/navigation";
import { ulid } from "ulid";
import { action, type ActionResult } from "@/lib/action";
import { attachMachine } from "@/lib/checks/attach-machine";
import { startRecheck } from "@/lib/checks/start-recheck";

/** A server action can be called with anything at all: only a form has fields. */
const field = (form: unknown, name: string): unknown => (form instanceof FormData ? form.get(name) : undefined);

/** Start a re-check of the check in the form and go to it. */
export async function recheckAction(_last: ActionResult<unknown> | null, form: FormData): Promise<ActionResult<unknown>> {
  const result = await action("check:run", (person, id) => startRecheck(person, String(id), { id: ulid() }))(field(form, "check"));
  if (result.ok) redirect(`/checks/${result.data.id}` as Route);
  return result;
}

/** Attach the finished check in the form to a machine. */
export async function attachMachineAction(_last: ActionResult<unknown> | null, form: FormData): Promise<ActionResult<unknown>> {
  const id = String(field(form, "check"));
  const result = await action("check:run", (person, machineId) => attachMachine(person, id, { machineId }))(field(form, "machineId"));
  if (result.ok) revalidatePath(`/checks/${encodeURIComponent(id)}`);
  return result;
}
