/** IEC 60757 letter codes in the order of its table, which is also the order in a two-colour code. */
export const IEC_COLOURS = [
  ["BK", "black"], ["BN", "brown"], ["RD", "red"], ["OG", "orange"], ["YE", "yellow"], ["GN", "green"], ["BU", "blue"],
  ["VT", "violet"], ["GY", "grey"], ["WH", "white"], ["PK", "pink"], ["GD", "gold"], ["TQ", "turquoise"], ["SR", "silver"],
] as const;

/** Letters of DIN 72551, met on older vehicle harnesses; only "gn" is the same as in IEC 60757. */
const DIN_COLOURS: ReadonlyMap<string, string> = new Map([
  ["SW", "black"], ["BR", "brown"], ["RT", "red"], ["RO", "red"], ["GE", "yellow"], ["BL", "blue"], ["HB", "light blue"], ["GR", "grey"],
  ["WS", "white"], ["LI", "lilac"], ["OR", "orange"], ["VI", "violet"], ["RS", "pink"], ["TR", "transparent"],
]);

const PROTECTIVE = { code: "GNYE", words: "green-and-yellow" } as const;

const OTHER_WORDS: ReadonlyMap<string, string> = new Map([["gray", "GY"], ["purple", "VT"], ["lilac", "VT"], ["light blue", "BU"]]);

export type ParsedColour =
  | { readonly ok: true; readonly code: string; readonly words: string }
  | { readonly ok: false; readonly code: "unknown-colour" | "other-scheme" | "too-many-colours"; readonly message: string };

function order(code: string): number {
  return IEC_COLOURS.findIndex(([known]) => known === code);
}

function codesOf(token: string): readonly string[] | null {
  const upper = token.toUpperCase();
  const word = IEC_COLOURS.find(([, name]) => name === token.toLowerCase())?.[0] ?? OTHER_WORDS.get(token.toLowerCase());
  if (word) return [word];
  const pairs = upper.match(/../g) ?? [];
  return upper.length % 2 === 0 && pairs.length > 0 && pairs.every((pair) => order(pair) >= 0) ? pairs : null;
}

/** Words for a code: "RDBU" -> "red and blue", "GNYE" -> "green-and-yellow"; null when it is no IEC 60757 code. */
export function colourWords(code: string): string | null {
  const pairs = codesOf(code);
  if (!pairs) return null;
  if (code.toUpperCase() === PROTECTIVE.code || code.toUpperCase() === "YEGN") return PROTECTIVE.words;
  return pairs.map((pair) => IEC_COLOURS[order(pair)]?.[1] ?? pair).join(" and ");
}

/** What DIN 72551 means by two letters that are no IEC code, or null: "GR" -> "grey". */
export function dinColour(letters: string): string | null {
  return DIN_COLOURS.get(letters.toUpperCase()) ?? null;
}

function otherScheme(token: string, meaning: string): ParsedColour {
  const iec = OTHER_WORDS.get(meaning) ?? IEC_COLOURS.find(([, word]) => word === meaning)?.[0];
  const instead = iec ? ` Enter ${iec} if the wire is ${meaning}.` : " Enter the colour as a word.";
  return { ok: false, code: "other-scheme", message: `"${token}" is ${meaning} in DIN 72551 and nothing in IEC 60757; one code does not tell which was meant.${instead}` };
}

function joined(codes: readonly string[]): ParsedColour {
  if (new Set(codes).size > 2) return { ok: false, code: "too-many-colours", message: "A wire has one colour or two. Enter for example BU, or RDBU for red and blue." };
  const sorted = [...new Set(codes)].sort((a, b) => order(a) - order(b));
  const code = sorted.join("") === "YEGN" ? PROTECTIVE.code : sorted.join("");
  return { ok: true, code, words: colourWords(code) ?? code };
}

/**
 * Reads a wire's colour from letters or words in either order ("rd/bu", "blue red", "green and yellow") into its IEC 60757 code.
 * DIN 72551 letters are named and refused: the scheme is never guessed from one code.
 */
export function parseColour(text: string): ParsedColour {
  const spelled = text.trim().toLowerCase().replace(/light[ -]blue/g, "blue");
  const tokens = spelled.split(/(?:\band\b|\bwith\b|[\s/+,-])+/).filter((token) => token !== "");
  const codes: string[] = [];
  for (const token of tokens) {
    const found = codesOf(token);
    const din = dinColour(token);
    if (!found && din) return otherScheme(token.toUpperCase(), din);
    if (!found) return { ok: false, code: "unknown-colour", message: `"${token.slice(0, 20)}" is no colour code of IEC 60757. Enter letters such as BK, BU or GNYE, or the colour as a word.` };
    codes.push(...found);
  }
  return codes.length === 0 ? { ok: false, code: "unknown-colour", message: "Enter the wire's colour, for example BK, BU or GNYE." } : joined(codes);
}
