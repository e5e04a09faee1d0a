import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { SignInForm } from "@/components/people/sign-in-form";
import { Notice, PageHeading } from "@/components/ui";
import { currentPerson } from "@/lib/auth/require-permission";
import { signInAction } from "./actions";

export const metadata: Metadata = { title: "Sign in" };

export default async function SignInPage({ searchParams }: PageProps<"/sign-in">) {
  if (await currentPerson()) redirect("/today");
  const { expired, ended } = await searchParams;
  return (
    <main className="mx-auto grid max-w-md gap-6 px-4 py-10 sm:py-16">
      <PageHeading title="Sign in" lead="To the workshop's checks, catalogue and machines." />
      {expired ? <Notice tone="ask" title="Sign in to go on">What you typed in a running check is kept on this phone.</Notice> : null}
      {ended ? <Notice tone="sound" title="You are signed out" live="polite">On this browser.</Notice> : null}
      <SignInForm action={signInAction} />
      <p className="text-quiet">No account yet? Ask an administrator of your workshop.</p>
    </main>
  );
}
