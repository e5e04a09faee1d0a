"use client";

import { ErrorMessage } from "@/components/shell/error-message";

export default function AppErrorPage({ error, reset }: { readonly error: Error & { digest?: string }; readonly reset: () => void }) {
  return <main><ErrorMessage digest={error.digest} retry={reset} /></main>;
}
