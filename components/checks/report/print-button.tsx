"use client";

import { Button } from "@/components/ui";

/** Opens the browser's print dialog, which also saves as PDF. */
export function PrintButton() {
  return <Button tone="main" onClick={() => window.print()}>Print or save as PDF</Button>;
}
