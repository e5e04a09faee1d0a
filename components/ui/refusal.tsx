import type { ActionResult } from "@/lib/action";
import { Notice } from "./notice";

/** Why an action was refused, announced as it appears; nothing while none was. */
export function Refusal({ result }: { readonly result: ActionResult<unknown> | null | undefined }) {
  return result && !result.ok ? <Notice tone="stop" title={result.error.message} live="assertive" /> : null;
}
