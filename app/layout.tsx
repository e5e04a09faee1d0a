import type { Metadata, Viewport } from "next";
import { cookies } from "next/headers";
import type { ReactNode } from "react";
import { parseTheme, THEME_COOKIE } from "@/lib/theme";
import { fontVariables } from "./fonts";
import "./globals.css";

export const metadata: Metadata = {
  title: { default: "Pinwright", template: "%s · Pinwright" },
  description: "Identify a three-wire device and prove its wiring with the meter you carry.",
};

export const viewport: Viewport = {
  width: "device-width",
  initialScale: 1,
  viewportFit: "cover",
};

/** Reading the theme's cookie makes every page dynamic, which the nonce of the content security policy needs anyway. */
export default async function RootLayout({ children }: { readonly children: ReactNode }) {
  const theme = parseTheme((await cookies()).get(THEME_COOKIE)?.value);
  return (
    <html lang="en-GB" data-theme={theme} className={fontVariables}>
      <body className="font-read">{children}</body>
    </html>
  );
}
