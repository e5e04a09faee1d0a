import type { Metadata } from "next";
import { cookies } from "next/headers";
import { SessionList } from "@/components/people/session-list";
import { Button, PageHeading, Sheet } from "@/components/ui";
import { currentSession, requirePermission } from "@/lib/auth/require-permission";
import { listOwnSessions } from "@/lib/people/list-own-sessions";
import { parseTheme, THEME_COOKIE, THEMES } from "@/lib/theme";
import { setThemeAction, signOutAction } from "../actions";
import { revokeSessionAction, signOutElsewhereAction } from "./actions";

export const metadata: Metadata = { title: "Account" };

const THEME_WORDS = { day: "Day", night: "Night, for a dark cab" } as const;

export default async function AccountPage() {
  const person = await requirePermission("account:own");
  const [sessions, current] = await Promise.all([listOwnSessions(person), currentSession()]);
  const theme = parseTheme((await cookies()).get(THEME_COOKIE)?.value);
  return (
    <>
      <PageHeading title="Account" lead={person.name} />
      <div className="grid max-w-3xl grid-cols-1 gap-6">
      <Sheet title="You">
        <dl className="grid gap-x-6 gap-y-1 sm:grid-cols-[auto_1fr]">
          <dt className="font-bold">E-mail address</dt><dd>{person.email}</dd>
          <dt className="font-bold">Roles</dt><dd>{person.roles.join(", ")}</dd>
        </dl>
        <form action={signOutAction} className="mt-4"><Button type="submit">Sign out this browser</Button></form>
      </Sheet>
      <Sheet title="Colours of this browser">
        <form action={setThemeAction} className="flex flex-wrap gap-3">
          {THEMES.map((name) => <Button key={name} type="submit" name="theme" value={name} aria-pressed={theme === name}>{THEME_WORDS[name]}</Button>)}
        </form>
      </Sheet>
      <Sheet title="Where you are signed in">
        <SessionList sessions={sessions.map((session) => ({ ...session, own: session.id === current?.sessionId }))} revoke={revokeSessionAction} revokeOthers={signOutElsewhereAction} />
      </Sheet>
      </div>
    </>
  );
}
