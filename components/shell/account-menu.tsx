import Link from "next/link";
import type { Theme } from "@/lib/theme";

interface AccountMenuProps {
  readonly name: string;
  readonly theme: Theme;
  readonly setTheme: (form: FormData) => Promise<void>;
  readonly signOut: () => Promise<void>;
}

const ITEM = "flex min-h-touch w-full cursor-pointer items-center px-4 text-left font-bold hover:bg-[var(--hover)]";

/** The browser's own popover: opens, closes on Escape and outside clicks, and gives the focus back, without a script. */
export function AccountMenu({ name, theme, setTheme, signOut }: AccountMenuProps) {
  const other: Theme = theme === "night" ? "day" : "night";
  return (
    <>
      <button type="button" popoverTarget="account-menu" className="tag-cut button button-plain min-h-touch max-w-48" aria-label={`Account: ${name}`}>
        <span className="truncate">{name}</span>
        <svg viewBox="0 0 12 12" aria-hidden="true" className="size-3 shrink-0"><path d="M1 3h10L6 10Z" fill="currentColor" /></svg>
      </button>
      <div id="account-menu" popover="auto" className="fixed inset-auto top-16 right-4 m-0 min-w-56 border-2 border-rule bg-sheet py-1 text-ink">
        <Link href="/account" className={ITEM}>Account and browsers</Link>
        <form action={setTheme}>
          <button type="submit" name="theme" value={other} className={ITEM}>{other === "night" ? "Night colours" : "Day colours"}</button>
        </form>
        <form action={signOut}>
          <button type="submit" className={ITEM}>Sign out</button>
        </form>
      </div>
    </>
  );
}
