/** Characters that stand for the same one in what people type, paste or dictate. */
const SAME: readonly (readonly [pattern: RegExp, plain: string])[] = [
  [/\u2126/g, "Ω"],
  [/\u00b5/g, "μ"],
  [/[\u2212\u2010-\u2015\ufe63\uff0d]/g, "-"],
  [/[\u2018\u2019\u02bc\u2032]/g, "'"],
  [/\uff0c/g, ","],
  [/\uff0e/g, "."],
  [/\uff0b/g, "+"],
  [/^plus /i, "+"],
  [/^minus /i, "-"],
];

/** One spelling for each character: Greek omega and mu, ASCII signs and digits, single spaces. */
export function cleanText(text: string): string {
  const digits = text.replace(/[\uff10-\uff19]/g, (digit) => String.fromCharCode(digit.charCodeAt(0) - 0xfee0));
  return SAME.reduce((now, [pattern, plain]) => now.replace(pattern, plain), digits.replace(/\s+/g, " ").trim());
}
