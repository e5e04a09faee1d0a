"use client";

import { Button, ButtonLink, MessagePage } from "@/components/ui";

interface ErrorMessageProps {
  /** A coded error's code; for a defect the number under which the log has it. */
  readonly digest: string | undefined;
  readonly retry: () => void;
}

/** What a page shows when it could not be made. What was typed in a running check is on the phone and stays. */
export function ErrorMessage({ digest, retry }: ErrorMessageProps) {
  if (digest === "not-signed-in") {
    return (
      <MessagePage title="You are signed out" actions={<ButtonLink href="/sign-in?expired=1" tone="main">Sign in</ButtonLink>}>
        <p>This browser&rsquo;s session has ended.</p>
      </MessagePage>
    );
  }
  if (digest === "not-allowed") {
    return (
      <MessagePage title="Your roles do not allow this" actions={<ButtonLink href="/today" tone="main">Go to Today</ButtonLink>}>
        <p>An administrator of the workshop gives roles. Nothing was changed.</p>
      </MessagePage>
    );
  }
  return (
    <MessagePage title="This page could not be shown" actions={<><Button tone="main" onClick={retry}>Try again</Button><ButtonLink href="/today">Go to Today</ButtonLink></>}>
      <p>Something went wrong here. What you typed in a running check is kept on this phone.</p>
      {digest ? <p className="mt-2">Tell an administrator this number: <span className="font-mono">{digest}</span></p> : null}
    </MessagePage>
  );
}
