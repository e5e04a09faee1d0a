"use server";

import { revalidatePath } from "next/cache";
import { action, type ActionResult } from "@/lib/action";
import { currentSession } from "@/lib/auth/require-permission";
import { notSignedIn } from "@/lib/errors";
import { formOf } from "@/lib/form-values";
import { revokeOwnSession } from "@/lib/people/revoke-own-session";
import { signOutElsewhere } from "@/lib/people/sign-out-elsewhere";

/** Sign one of one's own browsers out. */
export async function revokeSessionAction(_previous: ActionResult<unknown> | null, form: FormData): Promise<ActionResult<unknown>> {
  const result = await action("account:own", revokeOwnSession)({ sessionId: formOf(form).get("sessionId") });
  revalidatePath("/account");
  return result;
}

/** Sign every browser out but this one. */
export async function signOutElsewhereAction(): Promise<ActionResult<number>> {
  const result = await action("account:own", async (person) => {
    const current = await currentSession();
    if (!current) throw notSignedIn();
    return signOutElsewhere(person, current.sessionId);
  })(undefined);
  revalidatePath("/account");
  return result;
}
