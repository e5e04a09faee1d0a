import { cookies } from "next/headers";
import { redirect } from "next/navigation";
import type { ReactNode } from "react";
import { QueryProvider } from "@/components/shell/query-provider";
import { Shell } from "@/components/shell/shell";
import { currentPerson } from "@/lib/auth/require-permission";
import { parseTheme, THEME_COOKIE } from "@/lib/theme";
import { setThemeAction, signOutAction } from "./actions";

/** The frame of everything behind sign-in. No boundary: every page below authorises itself. */
export default async function WorkshopLayout({ children }: { readonly children: ReactNode }) {
  const person = await currentPerson();
  if (!person) redirect("/sign-in?expired=1");
  const theme = parseTheme((await cookies()).get(THEME_COOKIE)?.value);
  return (
    <Shell person={person} theme={theme} setTheme={setThemeAction} signOut={signOutAction}>
      <QueryProvider>{children}</QueryProvider>
    </Shell>
  );
}
