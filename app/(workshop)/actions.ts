"use server";

import { redirect } from "next/navigation";
import { openAction } from "@/lib/action";
import { signOutBrowser } from "@/lib/auth/browser-session";
import { formOf } from "@/lib/form-values";
import { setTheme } from "@/lib/people/set-theme";

/** Change the colours of this browser. A value that is no theme changes nothing. */
export async function setThemeAction(form: FormData): Promise<void> {
  await openAction(() => setTheme({ theme: formOf(form).get("theme") }), "theme:set");
}

/** Sign this browser out and say so. */
export async function signOutAction(): Promise<void> {
  const result = await openAction(signOutBrowser, "session:close");
  redirect(result.ok ? "/sign-in?ended=1" : "/account");
}
