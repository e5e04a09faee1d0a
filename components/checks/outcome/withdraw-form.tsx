import { Button } from "@/components/ui";

interface WithdrawFormProps {
  readonly confirmationId: string;
  /** What is withdrawn, for those who hear the button alone. */
  readonly what: string;
  readonly send: (form: FormData) => void;
  readonly busy: boolean;
}

/** Takes a confirmation back; behind one more press, because recording it again means typing it again. */
export function WithdrawForm({ confirmationId, what, send, busy }: WithdrawFormProps) {
  return (
    <details className="print:hidden">
      <summary className="link flex min-h-touch w-fit cursor-pointer items-center font-bold">Withdraw<span className="sr-only"> {what}</span></summary>
      <form action={send} className="grid justify-items-start gap-2 pb-2">
        <input type="hidden" name="confirmationId" value={confirmationId} />
        <p>It no longer counts, and the record of it stays.</p>
        <Button type="submit" tone="stop" busy={busy} busyLabel="Withdrawing …">Withdraw it<span className="sr-only">: {what}</span></Button>
      </form>
    </details>
  );
}
