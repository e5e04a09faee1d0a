import { colourWords, IEC_COLOURS } from "@/lib/units";
import type { Kind } from "@/lib/diagnosis";
import type { EntryData } from "./entry-data";
import { foldPartNumber } from "./entry-coherence";
import { pinsInOrder } from "./expect-of-entry";

/** Other words people type for a kind. */
const KIND_WORDS: Readonly<Record<Kind, string>> = {
  potentiometer: "potentiometer pot divider resistive", pwm: "pwm pulse duty powered", voltage: "voltage analogue powered",
};

/** True of every entry: typed beside what is meant ("brown wire"), they must not empty the list. */
const EVERY_ENTRY = "three-wire device sensor wires connector cavity pins";

const ascii = (text: string) => text.normalize("NFKD").toLowerCase().replace(/[\u0300-\u036f]/g, "");

/**
 * Words of a text as the search keeps them: lower-case letters and digits. A chunk with punctuation gives its pieces and
 * the whole without it: "TF-41/3" -> tf413, tf, 41, 3.
 */
export function foldWords(text: string): readonly string[] {
  return ascii(text).split(/\s+/).flatMap((chunk) => {
    const pieces = chunk.split(/[^a-z0-9]+/).filter((piece) => piece !== "");
    return pieces.length > 1 ? [pieces.join(""), ...pieces] : pieces;
  });
}

/** "5" for 5 V, "battery" for battery voltage: the value of the supply facet. */
export function supplyFacet(data: Pick<EntryData, "supply">): string {
  return data.supply.type === "fixed" ? String(data.supply.volts) : "battery";
}

/** IEC 60757 letters in cavity order: "BN/BU/BK". */
export function coloursFacet(data: Pick<EntryData, "pins" | "connector">): string {
  return pinsInOrder(data).map((pin) => pin.colour).join("/");
}

/** Every word an entry is found by, once each, joined by spaces. */
export function searchTextOf(data: EntryData): string {
  const colours = pinsInOrder(data).map((pin) => pin.colour);
  const supply = data.supply.type === "fixed" ? `${data.supply.volts}v` : "battery";
  const texts = [
    ...data.partNumbers, ...data.partNumbers.map(foldPartNumber), data.name, data.maker, data.senses, data.movement, KIND_WORDS[data.kind],
    data.connector.name, data.connector.gender, supply, data.healthy.output ?? "",
    ...colours, colours.join("/"), ...colours.map((code) => colourWords(code) ?? ""),
  ];
  return [...new Set([...texts, EVERY_ENTRY].flatMap(foldWords))].join(" ");
}

function isColour(piece: string): boolean {
  return IEC_COLOURS.some(([code, word]) => code.toLowerCase() === piece || word === piece) || colourWords(piece) !== null;
}

const MOST_WORDS = 8;

/**
 * The words of a query as typed, eight at most: punctuation inside a chunk is dropped ("TF-41/3" -> tf413), but
 * a row of wire colours falls apart into its colours ("BN/BU/BK" -> bn, bu, bk).
 */
export function queryWords(q: string): readonly string[] {
  const words = ascii(q).split(/\s+/).flatMap((chunk) => {
    const pieces = chunk.split(/[^a-z0-9]+/).filter((piece) => piece !== "");
    return pieces.length > 1 && !pieces.every(isColour) ? [pieces.join("")] : pieces;
  });
  return [...new Set(words)].slice(0, MOST_WORDS);
}
