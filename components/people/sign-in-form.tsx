"use client";

import { startTransition, useActionState, useEffect } from "react";
import { useForm } from "react-hook-form";
import { Button, Field, Notice, TextInput } from "@/components/ui";
import type { SignInInput } from "@/lib/auth/schemas";
import type { ErrorBody } from "@/lib/errors";
import { lazyResolver } from "@/lib/form-resolver";

interface State { readonly error?: ErrorBody; readonly email: string }
interface SignInFormProps { readonly action: (previous: State, form: FormData) => Promise<State> }

const resolver = lazyResolver<SignInInput>(async () => (await import("@/lib/auth/schemas")).signInSchema);

/** The sign-in form. Without JavaScript it is sent as it is, and the server's answer is shown the same way. */
export function SignInForm({ action }: SignInFormProps) {
  const [state, send, sending] = useActionState(action, { email: "" });
  const { register, handleSubmit, formState: { errors, isSubmitting }, resetField, setFocus } = useForm<SignInInput>({ resolver, defaultValues: { email: state.email, password: "" } });
  const busy = sending || isSubmitting;

  useEffect(() => {
    if (!state.error) return;
    resetField("password");
    setFocus(state.error.fields?.email ? "email" : "password");
  }, [state, resetField, setFocus]);

  const submit = handleSubmit((_values, event) => {
    const form = new FormData(event?.target as HTMLFormElement);
    startTransition(() => send(form));
  });

  return (
    <form action={send} onSubmit={submit} noValidate className="grid gap-5">
      {state.error ? <Notice tone="stop" title={state.error.message} live="assertive" /> : null}
      <Field label="E-mail address" error={errors.email?.message ?? state.error?.fields?.email}>
        <TextInput {...register("email")} type="email" defaultValue={state.email} autoComplete="username" autoCapitalize="none" spellCheck={false} required />
      </Field>
      <Field label="Password" error={errors.password?.message ?? state.error?.fields?.password}>
        <TextInput {...register("password")} type="password" autoComplete="current-password" required />
      </Field>
      <Button type="submit" tone="main" size="glove" busy={busy} busyLabel="Signing in …">Sign in</Button>
    </form>
  );
}
