import { parseCheck, type EvidenceRow, type Prediction, type ReadingValue } from "@/lib/diagnosis";
import { formatQuantity } from "@/lib/units";

/** A word expected with less than this chance does not count as fitting. */
const WORD_FLOOR = 0.04;

function wordText(word: string): string {
  return word === "none" ? "no signal" : word;
}

/** From this ratio of its ends a band counts as wide. */
const WIDE = 3;

/**
 * What a hypothesis expects of a reading, e.g. "4.9 V to 5.1 V", "OL", "smooth or jumps".
 * The number is the band that holds 95 %; its digits stop where the band's own width makes them idle.
 */
export function expectedWords(prediction: Prediction): string {
  const unit = parseCheck(prediction.check)?.unit;
  const words = prediction.words.filter((w) => w.p >= WORD_FLOOR).map((w) => wordText(w.word));
  if (!prediction.number || !unit || unit === "word") return words.length > 0 ? words.join(" or ") : "anything";
  const { low, high } = prediction.number;
  // A band over decades is said in two digits at each end; a narrow one as finely as its width makes sense of.
  const limitAt = (end: number) => (low > 0 && high > WIDE * low ? end / 10 : (high - low) / 4);
  const [from, to] = [formatQuantity(low, unit, { limit: limitAt(low) }), formatQuantity(high, unit, { limit: limitAt(high) })];
  const band = from === to ? from : `${from} to ${to}`;
  return words.length > 0 ? `${band}, or ${words.join(" or ")}` : band;
}

/**
 * Does a reading lie where a prediction has it? A number may miss the 95 % band by the meter's limit of error;
 * a word fits from WORD_FLOOR on.
 */
export function fits(prediction: Prediction, value: ReadingValue, limit: number | null): boolean {
  if (typeof value === "string") return prediction.words.some((w) => w.word === value && w.p >= WORD_FLOOR);
  if (!prediction.number) return false;
  const slack = limit ?? 0;
  return value >= prediction.number.low - slack && value <= prediction.number.high + slack;
}

export type Bearing = "fits-both" | "against-sound" | "against-finding" | "against-both";

/** On which side a row of the evidence stands. */
export function bearing(row: EvidenceRow): Bearing {
  const sound = fits(row.ifSound, row.value, row.limit);
  const finding = fits(row.ifFinding, row.value, row.limit);
  if (sound && finding) return "fits-both";
  if (finding) return "against-sound";
  return sound ? "against-finding" : "against-both";
}

export const BEARING_WORDS: Readonly<Record<Bearing, string>> = {
  "fits-both": "fits both",
  "against-sound": "speaks for the finding",
  "against-finding": "speaks against the finding",
  "against-both": "fits neither: take it again",
};

/** Meter's limit of error at a reading, e.g. "± 0.029 V"; words have none. */
export function limitWords(row: Pick<EvidenceRow, "check" | "value" | "limit">): string {
  const unit = parseCheck(row.check)?.unit;
  if (row.limit === null || !unit || unit === "word" || typeof row.value === "string") return "none";
  // Two digits of the limit itself; its own size stands in for its uncertainty.
  return `\u00b1\u00a0${formatQuantity(row.limit, unit, { limit: row.limit / 9 })}`;
}
