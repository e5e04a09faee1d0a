import type { Config } from "tailwindcss";

/**
 * The look in one place. Colours are CSS variables (app/globals.css) so that the cab-at-night theme
 * changes them all at once; every text colour keeps 7:1 on its ground in both themes.
 */
const config: Config = {
  content: ["./app/**/*.tsx", "./components/**/*.tsx"],
  theme: {
    extend: {
      colors: {
        paper: "var(--paper)",
        sheet: "var(--sheet)",
        ink: "var(--ink)",
        quiet: "var(--quiet)",
        rule: "var(--rule)",
        bench: "var(--bench)",
        "on-bench": "var(--on-bench)",
        copper: "var(--copper)",
        straw: "var(--straw)",
        "on-straw": "var(--on-straw)",
        stop: "var(--stop)",
        "on-stop": "var(--on-stop)",
        sound: "var(--sound)",
      },
      fontFamily: {
        read: ["var(--font-read)", "var(--font-read-greek)", "var(--font-read-micro)", "var(--font-maths)", "sans-serif"],
        // IBM Plex Mono has no Greek in its package, so the ohm sign comes from the sans.
        mono: ["var(--font-mono-point)", "var(--font-mono)", "var(--font-read-greek)", "var(--font-maths)", "monospace"],
      },
      spacing: { touch: "2.75rem", glove: "6rem" },
    },
  },
};

export default config;
