import { parseCheck, type EvidenceRow, type Fault, type PinAssignment, type Prediction, type ReadingValue } from "@/lib/diagnosis";
import { formatQuantity } from "@/lib/units";
import { checkName, readingWords, type Labels } from "./check-name";
import { findingClause } from "./finding-words";

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

/** Meter's limit of error at a reading, e.g. "± 0.029 V"; words have none. */
export function limitWords(row: Pick<EvidenceRow, "check" | "value" | "limit">): string {
  const unit = parseCheck(row.check)?.unit;
  if (row.limit === null || !unit || unit === "word" || typeof row.value === "string") return "none";
  // Two digits of the limit itself; its own size stands in for its uncertainty.
  return `\u00b1\u00a0${formatQuantity(row.limit, unit, { limit: row.limit / 9 })}`;
}

/** From this factor on, up or down, a reading has moved a chance. */
const MOVES = 1.1;
/** Beyond this a factor or distance is not told in figures: the model itself is not that good. */
const MOST_TIMES = 1000;
/**
 * Half a band, in limits of error: up to NARROW it is as good as its middle, beyond WIDE_LIMITS the meter's limit plays no part in it.
 * What lies WELL_BEYOND halves of the band from its middle is simply "away".
 */
const NARROW = 3, WIDE_LIMITS = 10, WELL_BEYOND = 10;

/** A positive number of times with the digits that mean something: "0.4", "1.6", "12", "170", "more than 1000". */
export function timesWords(times: number): string {
  if (times > MOST_TIMES) return `more than ${MOST_TIMES}`;
  return times < 9.95 ? String(Number(times.toFixed(1))) : String(Number(times.toPrecision(2)));
}

/** How far a reading is from what is expected: ", and it did, 0.4 times the meter's limit of error off the middle". */
function offWords({ value, limit }: Pick<EvidenceRow, "value" | "limit">, expected: Prediction, off: number | null): string {
  const agrees = fits(expected, value, limit);
  const did = parseCheck(expected.check)?.unit === "word" ? "was" : "did";
  if (off === null || !expected.number || !limit) return agrees ? `, and it ${did}` : `; it ${did} not`;
  const times = `${timesWords(Math.abs(off))} times the meter's limit of error`, half = (expected.number.high - expected.number.low) / 2 / limit;
  if (agrees && half > WIDE_LIMITS) return ", and it did";
  if (agrees) return Math.abs(off) < 0.05 ? ", and it did, right in the middle" : `, and it did, ${times} off the middle`;
  return `; it is ${Math.abs(off) > MOST_TIMES ? "" : "about "}${times} away${half > NARROW && Math.abs(off) < WELL_BEYOND * half ? " from the middle of that" : ""}`;
}

const wouldRead = (expected: Prediction) => (parseCheck(expected.check)?.unit === "word" ? `the answer would be ${expectedWords(expected)}` : `it would read ${expectedWords(expected)}`);

/** What the reading should have been, and how far it was off, e.g. "it would read 4.90 V to 5.10 V; it is about 98 times the meter's limit of error away". */
export function expectedPhrase(row: EvidenceRow, against: "sound" | "finding"): string {
  const expected = against === "sound" ? row.ifSound : row.ifFinding;
  return wouldRead(expected) + offWords(row, expected, against === "sound" ? row.offIfSound : row.offLimits);
}

export type Movement = "for" | "against" | "rules" | "neither";

/** Which way a reading moved the chance of the finding; where no factor was kept, whether it agrees. */
export function movement(row: EvidenceRow): Movement {
  if (row.factor === null) return fits(row.ifFinding, row.value, row.limit) ? "for" : "against";
  if (row.factor * MOST_TIMES <= 1) return "rules";
  return row.factor >= MOVES ? "for" : row.factor * MOVES <= 1 ? "against" : "neither";
}

/**
 * By how much a reading moved the chance of a finding, beside the other readings: "That made this about 50 times less likely."
 * Null for a record of before it was kept. What is all but impossible is ruled out, as far as the reading can be trusted.
 */
export function movedSentence(row: EvidenceRow): string | null {
  const { factor } = row;
  if (factor === null) return null;
  const times = (n: number) => (n > MOST_TIMES ? timesWords(n) : `about ${n < 9.95 ? timesWords(n) : String(Number(n.toPrecision(1)))}`);
  const agrees = fits(row.ifFinding, row.value, row.limit), closer = agrees ? "Something else expects it more closely: that" : "That";
  if (factor * MOST_TIMES <= 1) return `${closer} rules this out, unless the reading is wrong.`;
  if (factor >= MOVES) return `${agrees ? "That" : "Everything else expects it even less: that"} made this ${times(factor)} times more likely.`;
  if (factor * MOVES <= 1) return `${closer} made this ${times(1 / factor)} times less likely.`;
  return agrees ? "Beside the other readings, that changed next to nothing." : "The other readings speak against this too: beside them, that changed next to nothing.";
}

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

/** A row of the evidence in the compact form of a list whose heading names the finding. */
export function evidencePhrases(row: EvidenceRow): readonly string[] {
  const moved = movedSentence(row);
  return [`${capital(expectedPhrase(row, "finding"))}.`, ...(moved ? [moved] : [])];
}

/** A row of the evidence in full: what was read, what it should have been if the finding is true, how far off, and what that did to its chance. */
export function evidenceSentence(row: EvidenceRow, finding: Fault, labels: Labels, pins: PinAssignment | null): string {
  const moved = movedSentence(row), verb = parseCheck(row.check)?.unit === "word" ? "gave" : "read";
  return `${checkName(row.check, labels)}, ${verb} ${readingWords(row.check, row.value)}. If ${findingClause(finding, labels, pins)}, ${expectedPhrase(row, "finding")}.${moved ? ` ${moved}` : ""}`;
}
