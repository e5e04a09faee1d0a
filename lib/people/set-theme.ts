import "server-only";
import { cookies } from "next/headers";
import { parseInput } from "@/lib/parse";
import { THEME_COOKIE } from "@/lib/theme";
import { setThemeSchema } from "./schemas";

/**
 * Keep the colours chosen in this browser for a year. No permission: it concerns nobody else.
 * @throws AppError invalid-input (400)
 */
export async function setTheme(input: unknown): Promise<void> {
  const { theme } = parseInput(setThemeSchema, input);
  (await cookies()).set(THEME_COOKIE, theme, { path: "/", sameSite: "lax", maxAge: 365 * 86_400 });
}
