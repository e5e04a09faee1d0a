import Link from "next/link";
import type { ReactNode } from "react";
import { BrandMark } from "@/components/ui";
import { hasPermission, type Person } from "@/lib/auth/permissions";
import type { Theme } from "@/lib/theme";
import { AccountMenu } from "./account-menu";
import { PlaceLinks } from "./place-links";
import { PLACES, type Place } from "./places";

interface ShellProps {
  readonly person: Person;
  readonly theme: Theme;
  readonly setTheme: (form: FormData) => Promise<void>;
  readonly signOut: () => Promise<void>;
  readonly children: ReactNode;
}

function placesOf(person: Person): Place[] {
  const { today, catalogue, checks, machines, workshop } = PLACES;
  return [today, catalogue, checks, machines, ...(hasPermission(person, "people:read") ? [workshop] : [])];
}

/** Top bar, and on a phone a bottom bar within reach of the thumb. Printing shows neither. */
export function Shell({ person, theme, setTheme, signOut, children }: ShellProps) {
  const places = placesOf(person);
  return (
    <>
      <a href="#content" className="sr-only focus:not-sr-only focus:fixed focus:top-2 focus:left-2 focus:z-20 focus:bg-bench focus:px-4 focus:py-3 focus:font-bold focus:text-on-bench">Skip to content</a>
      <header className="sticky top-0 z-10 border-b-2 border-rule bg-paper print:hidden">
        <div className="mx-auto flex max-w-6xl items-center justify-between gap-4 px-4 py-2">
          <Link href="/today" className="flex min-h-touch items-center"><BrandMark /></Link>
          <div className="hidden md:block"><PlaceLinks places={places} label="Places" variant="top" /></div>
          <AccountMenu name={person.name} theme={theme} setTheme={setTheme} signOut={signOut} />
        </div>
      </header>
      <main id="content" tabIndex={-1} className="mx-auto max-w-6xl px-4 py-6 pb-32 outline-none md:pb-12 print:max-w-none print:p-0">{children}</main>
      <div data-bottom-bar className="fixed inset-x-0 bottom-0 z-10 border-t-2 border-rule bg-paper pb-[env(safe-area-inset-bottom)] md:hidden print:hidden">
        <PlaceLinks places={places} label="Places" variant="bottom" />
      </div>
    </>
  );
}
