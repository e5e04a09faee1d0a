import type { OutboxState } from "./use-outbox";

/** Where the readings are: quiet while all is well, plain words when something waits. */
export function SentMark({ outbox, kept }: { readonly outbox: OutboxState; readonly kept: boolean }) {
  if (!kept) return <p className="bg-straw px-2 py-1 text-on-straw"><strong>This browser keeps nothing.</strong> Do not close or reload this page before the verdict.</p>;
  if (outbox.unsent === 0) return <p className="text-quiet">Kept on this phone and sent.</p>;
  if (outbox.last === "signed-out") return <p className="bg-straw px-2 py-1 text-on-straw"><strong>You are signed out.</strong> Kept on this phone; sign in to send it.</p>;
  if (outbox.last === "refused") return <p className="bg-straw px-2 py-1 text-on-straw"><strong>The server refused it.</strong> Kept on this phone.</p>;
  return <p className="text-quiet"><span aria-hidden="true">◌ </span>Kept on this phone, will be sent{outbox.last === "offline" ? " when the server answers" : ""}.</p>;
}
