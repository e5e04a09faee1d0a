import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { SignInForm } from "@/components/people/sign-in-form";
import { BenchDrawing } from "@/components/shell/bench-drawing";
import { OuterFrame } from "@/components/shell/outer-frame";
import { Notice, PageHeading } from "@/components/ui";
import { currentPerson } from "@/lib/auth/require-permission";
import { signInAction } from "./actions";

export const metadata: Metadata = { title: "Sign in" };

export default async function SignInPage({ searchParams }: PageProps<"/sign-in">) {
  if (await currentPerson()) redirect("/today");
  const { expired, ended } = await searchParams;
  return (
    <OuterFrame>
      <div className="grid items-center gap-16 md:grid-cols-[minmax(0,26rem)_minmax(0,1fr)]">
        <div className="grid gap-5">
          <PageHeading title="Sign in" lead="To the workshop’s checks, catalogue and machines." />
          {expired ? <Notice tone="ask" title="Sign in to go on">What you typed in a running check is kept on this phone.</Notice> : null}
          {ended ? <Notice tone="sound" title="You are signed out" live="polite">On this browser.</Notice> : null}
          <SignInForm action={signInAction} />
          <p className="text-quiet">No account yet? Ask an administrator of your workshop.</p>
        </div>
        <BenchDrawing className="hidden max-w-lg md:mx-auto md:block" />
      </div>
    </OuterFrame>
  );
}
