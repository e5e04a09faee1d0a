/** Day is the default; night is for a dark cab. Kept in a cookie so that the first paint is right. */
export const THEMES = ["day", "night"] as const;
export type Theme = (typeof THEMES)[number];

export const THEME_COOKIE = "pinwright_theme";

/** Anything but a known theme is day. */
export function parseTheme(value: string | undefined): Theme {
  return value === "night" ? "night" : "day";
}
