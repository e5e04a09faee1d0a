"use client";

import { ErrorMessage } from "@/components/shell/error-message";

export default function WorkshopError({ error, reset }: { readonly error: Error & { digest?: string }; readonly reset: () => void }) {
  return <ErrorMessage digest={error.digest} retry={reset} />;
}
