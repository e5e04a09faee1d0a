import localFont from "next/font/local";

// Only the two main faces are preloaded. The others stand behind them by unicode-range and are fetched
// when a page shows one of their signs: neither main face has the ohm sign, the comparison signs or arrows.
// No generated fallback face: it would stand before the Greek one and lend its own ohm sign.
// The compiler reads these calls as they stand: a file that serves twice has to be written twice.

export const read = localFont({
  src: "../node_modules/@fontsource-variable/atkinson-hyperlegible-next/files/atkinson-hyperlegible-next-latin-wght-normal.woff2", weight: "200 800",
  variable: "--font-read", display: "swap", adjustFontFallback: false,
});

export const readGreek = localFont({
  src: [
    { path: "../node_modules/@fontsource/ibm-plex-sans/files/ibm-plex-sans-greek-400-normal.woff2", weight: "400", style: "normal" },
    { path: "../node_modules/@fontsource/ibm-plex-sans/files/ibm-plex-sans-greek-700-normal.woff2", weight: "700", style: "normal" },
  ],
  variable: "--font-read-greek",
  display: "swap",
  preload: false,
  adjustFontFallback: false,
  declarations: [{ prop: "unicode-range", value: "U+0370-03FF" }],
});

export const mono = localFont({
  src: [
    { path: "../node_modules/@fontsource/b612-mono/files/b612-mono-latin-400-normal.woff2", weight: "400", style: "normal" },
    { path: "../node_modules/@fontsource/b612-mono/files/b612-mono-latin-700-normal.woff2", weight: "700", style: "normal" },
  ],
  variable: "--font-mono",
  display: "swap",
  adjustFontFallback: false,
});

/**
 * Point, comma, colon and space for readings. The monospaced face gives each of them a whole cell, so that "4.7 kΩ"
 * falls apart into "4. 7  kΩ"; with these from the reading face a number stays one thing, and digits still align. Preloaded as that face is, so that
 * both name the same file and no line is set twice.
 */
export const monoPoint = localFont({
  src: "../node_modules/@fontsource-variable/atkinson-hyperlegible-next/files/atkinson-hyperlegible-next-latin-wght-normal.woff2", weight: "200 800",
  variable: "--font-mono-point", display: "swap", adjustFontFallback: false,
  declarations: [{ prop: "unicode-range", value: "U+0020,U+002C,U+002E,U+003A,U+003B,U+00A0" }],
});

/** The micro sign, which the reading face lacks. */
export const readMicro = localFont({
  src: [{ path: "../node_modules/@fontsource/ibm-plex-sans/files/ibm-plex-sans-latin-400-normal.woff2", weight: "400", style: "normal" }],
  variable: "--font-read-micro",
  display: "swap",
  preload: false,
  adjustFontFallback: false,
  declarations: [{ prop: "unicode-range", value: "U+00B5" }],
});

export const maths = localFont({
  src: [{ path: "../node_modules/@fontsource/noto-sans-math/files/noto-sans-math-latin-400-normal.woff2", weight: "400", style: "normal" }],
  variable: "--font-maths",
  display: "swap",
  preload: false,
  adjustFontFallback: false,
  declarations: [{ prop: "unicode-range", value: "U+2190-21FF,U+2200-22FF,U+25A0-25FF,U+2713" }],
});

/** Class names that declare the font variables; put them on the html element. */
export const fontVariables = [read, readGreek, readMicro, monoPoint, mono, maths].map((font) => font.variable).join(" ");
