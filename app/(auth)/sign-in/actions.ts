"use server";

import { redirect } from "next/navigation";
import { openAction } from "@/lib/action";
import { signInBrowser } from "@/lib/auth/browser-session";
import type { ErrorBody } from "@/lib/errors";
import { formOf } from "@/lib/form-values";

export interface SignInState { readonly error?: ErrorBody; readonly email: string }

/** Sign in and go to Today; with an error the address typed comes back, the password never. */
export async function signInAction(_previous: SignInState, form: FormData): Promise<SignInState> {
  const email = formOf(form).get("email");
  const result = await openAction(() => signInBrowser({ email, password: formOf(form).get("password") }), "sign-in");
  if (!result.ok) return { error: result.error, email: typeof email === "string" ? email.slice(0, 254) : "" };
  redirect("/today");
}
