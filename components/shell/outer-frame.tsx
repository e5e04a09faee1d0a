import Link from "next/link";
import type { ReactNode } from "react";
import { BrandMark } from "@/components/ui";

/** The frame of every page outside the workshop: whose it is, and the page. */
export function OuterFrame({ children }: { readonly children: ReactNode }) {
  return (
    <>
      <header className="border-b-2 border-rule">
        <div className="mx-auto flex max-w-6xl px-4 py-2">
          <Link href="/" className="flex min-h-touch items-center"><BrandMark /></Link>
        </div>
      </header>
      <main className="mx-auto max-w-6xl px-4 py-6 sm:py-10">{children}</main>
    </>
  );
}
