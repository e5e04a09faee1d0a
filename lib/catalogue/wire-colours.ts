/**
 * Colour letters of IEC 60757 (1983 and 2021 editions), in the order in which they are joined: RDBU, never BURD.
 * Green and yellow together is only GNYE.
 */
export const WIRE_COLOURS: Readonly<Record<string, string>> = {
  BK: "black", BN: "brown", RD: "red", OG: "orange", YE: "yellow", GN: "green", BU: "blue", VT: "violet",
  GY: "grey", WH: "white", PK: "pink", GD: "gold", TQ: "turquoise", SR: "silver",
};

const ORDER = Object.keys(WIRE_COLOURS);

/** The single codes of a wire's letters in order ("RDBU" -> RD, BU), or null when they are none of the standard. */
export function colourCodes(letters: string): readonly string[] | null {
  const codes = letters.match(/../g) ?? [];
  if (letters.length % 2 !== 0 || codes.length === 0 || codes.some((code) => WIRE_COLOURS[code] === undefined)) return null;
  if (letters === "GNYE") return codes;
  const places = codes.map((code) => ORDER.indexOf(code));
  return places.every((place, i) => i === 0 || place > (places[i - 1] ?? 0)) ? codes : null;
}

/** "BU" -> "blue", "RDBU" -> "red and blue", "GNYE" -> "green-and-yellow"; letters that are no colour come back as they are. */
export function colourWord(letters: string): string {
  const words = colourCodes(letters)?.map((code) => WIRE_COLOURS[code]);
  if (!words) return letters;
  return letters === "GNYE" ? "green-and-yellow" : words.join(" and ");
}
