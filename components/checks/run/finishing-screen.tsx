import { Button, Notice } from "@/components/ui";
import { ScreenHeading } from "./screen-heading";
import type { OutboxState } from "./use-outbox";

interface FinishingScreenProps { readonly outbox: OutboxState; readonly refusal: string | null; readonly onRetry: () => void; readonly onBack: () => void }

/** The verdict is written by the server; until it answers the check waits here, kept on the phone. */
export function FinishingScreen({ outbox, refusal, onRetry, onBack }: FinishingScreenProps) {
  const silent = outbox.last === "offline";
  const stuck = silent || outbox.last === "signed-out" || refusal !== null;
  return (
    <section className="grid gap-4">
      <ScreenHeading screen="finishing">{silent ? "The verdict waits for the server" : "Writing the verdict \u2026"}</ScreenHeading>
      {silent ? <p className="text-lg">Everything is kept on this phone and is sent as soon as the server answers. You may close this page; what is believed so far stands above.</p> : null}
      {outbox.last === "signed-out" ? <Notice tone="ask" title="You are signed out">Sign in again: the check is kept on this phone and carries on from here. <a className="link" href="/sign-in">Sign in</a></Notice> : null}
      {refusal ? <Notice tone="stop" title="The server did not take this check" live="assertive">{refusal} It is kept on this phone.</Notice> : null}
      {stuck ? <Button tone="main" size="glove" className="w-full text-2xl" onClick={onRetry}>Try now</Button> : <p className="text-lg">The server works it out from every reading. This takes a few seconds.</p>}
      <Button size="glove" className="w-full" onClick={onBack}>Back to the readings</Button>
    </section>
  );
}
