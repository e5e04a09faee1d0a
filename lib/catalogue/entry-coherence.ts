import { parseColour } from "@/lib/units";
import type { EntryData, RestFull } from "./entry-data";
import { tableSpan } from "./transfer";

/** One thing that does not fit, at a path of the entry's data, in a sentence that says what to enter instead. */
export interface Problem { readonly path: readonly (string | number)[]; readonly message: string }

const unique = (items: readonly string[]) => new Set(items).size === items.length;

function pinProblems(data: EntryData): Problem[] {
  const problems: Problem[] = [];
  const { pins, connector } = data;
  if (!unique(pins.map((p) => p.role))) problems.push({ path: ["pins"], message: "Give supply, ground and signal one pin each." });
  if (!unique(pins.map((p) => p.cavity))) problems.push({ path: ["pins"], message: "Give each pin a cavity of its own." });
  pins.forEach((pin, i) => {
    if (!connector.cavities.some((c) => c.label === pin.cavity)) {
      problems.push({ path: ["pins", i, "cavity"], message: `The connector has no cavity ${pin.cavity}. Enter one of ${connector.cavities.map((c) => c.label).join(", ")}.` });
    }
    const colour = parseColour(pin.colour);
    if (!colour.ok || colour.code !== pin.colour) problems.push({ path: ["pins", i, "colour"], message: `${pin.colour} is no colour of IEC 60757. Enter letters such as BN, BU or GNYE.` });
  });
  return problems;
}

function connectorProblems({ connector }: EntryData): Problem[] {
  const problems: Problem[] = [];
  if (!unique(connector.cavities.map((c) => c.label))) problems.push({ path: ["connector", "cavities"], message: "Give each cavity a label of its own." });
  const crowded = connector.cavities.some((a, i) => connector.cavities.some((b, j) => j < i && Math.hypot(a.row - b.row, a.column - b.column) < 0.75));
  if (crowded) problems.push({ path: ["connector", "cavities"], message: "Two cavities stand in the same place. Set rows and columns at least 0.75 pitch apart." });
  return problems;
}

const NEEDED = {
  potentiometer: ["totalOhms", "tolerancePercent", "signalRatio"],
  pwm: ["output", "frequencyHz", "duty", "pullUpNeeded"],
  voltage: ["signalVolts"],
} as const;

const READING_NAMES = {
  totalOhms: "total resistance", tolerancePercent: "tolerance", wiperSeriesOhms: "wiper series resistance", signalRatio: "signal ratio",
  signalVolts: "signal volts", duty: "duty", frequencyHz: "frequency", output: "output type", pullUpNeeded: "whether it needs a pull-up",
} as const;

function healthyProblems(data: EntryData): Problem[] {
  const { healthy, kind, supply } = data;
  const needed: readonly (keyof typeof READING_NAMES)[] = NEEDED[kind];
  const allowed: readonly string[] = kind === "potentiometer" ? [...needed, "wiperSeriesOhms"] : needed;
  const names = Object.keys(READING_NAMES) as (keyof typeof READING_NAMES)[];
  const problems: Problem[] = names.flatMap((name) => {
    const present = healthy[name] !== undefined;
    if (needed.includes(name) && !present) return [{ path: ["healthy", name], message: `A ${kind} device needs its ${READING_NAMES[name]}.` }];
    if (!allowed.includes(name) && present) return [{ path: ["healthy", name], message: `A ${kind} device has no ${READING_NAMES[name]}. Leave it out.` }];
    return [];
  });
  if (healthy.output && healthy.pullUpNeeded !== undefined && (healthy.output === "open-collector") !== healthy.pullUpNeeded) {
    problems.push({ path: ["healthy", "pullUpNeeded"], message: "An open-collector output needs a pull-up, a push-pull output does not." });
  }
  const top = healthy.signalVolts && Math.max(healthy.signalVolts.rest, healthy.signalVolts.full);
  const limit = supply.type === "fixed" ? supply.volts : supply.minVolts;
  if (top !== undefined && top > limit) problems.push({ path: ["healthy", "signalVolts"], message: `The signal cannot rise above its supply of ${limit} V.` });
  if (supply.type === "battery" && supply.minVolts >= supply.maxVolts) {
    problems.push({ path: ["supply", "maxVolts"], message: "Enter a highest battery voltage above the lowest." });
  }
  return problems;
}

/** The reading that the transfer table is entered with, and its unit, for each kind. */
export function healthySignal(data: Pick<EntryData, "kind" | "healthy">): { readonly unit: "ratio" | "volt"; readonly span: RestFull | undefined } {
  if (data.kind === "voltage") return { unit: "volt", span: data.healthy.signalVolts };
  return { unit: "ratio", span: data.kind === "pwm" ? data.healthy.duty : data.healthy.signalRatio };
}

function transferProblems(data: EntryData): Problem[] {
  const problems: Problem[] = [];
  const { points, signal } = data.transfer;
  const { unit, span } = healthySignal(data);
  if (signal.unit !== unit) problems.push({ path: ["transfer", "signal", "unit"], message: `The signal of a ${data.kind} device is given in ${unit}.` });
  const steps = points.slice(1).map((p, i) => ({ signal: p.signal - (points[i]?.signal ?? NaN), value: Math.sign(p.value - (points[i]?.value ?? NaN)) }));
  if (steps.some((s) => !(s.signal > 0))) problems.push({ path: ["transfer", "points"], message: "Enter the points with a rising signal, none twice." });
  if (steps.some((s) => s.value === 0 || s.value !== steps[0]?.value)) {
    problems.push({ path: ["transfer", "points"], message: "The value must rise all the way or fall all the way, or it cannot be read back." });
  }
  const [low, high] = tableSpan(data.transfer).signal;
  if (span && (Math.min(span.rest, span.full) < low || Math.max(span.rest, span.full) > high)) {
    problems.push({ path: ["transfer", "points"], message: "The table must reach from the reading at rest to the reading at full travel." });
  }
  if (span && span.rest === span.full) problems.push({ path: ["healthy"], message: "The readings at rest and at full travel must differ." });
  if (unit === "ratio" && (low < 0 || high > 1)) problems.push({ path: ["transfer", "points"], message: "Give the signal as a share from 0 to 1." });
  return problems;
}

/** Folded part number: letters and digits only, lower case; "TF-41/3 B" and "tf413b" are the same number. */
export function foldPartNumber(text: string): string {
  return text.normalize("NFKD").toLowerCase().replace(/[^a-z0-9]/g, "");
}

/** Everything in an entry that contradicts something else in it; empty when it is coherent. */
export function coherenceProblems(data: EntryData): readonly Problem[] {
  const parts = unique(data.partNumbers.map(foldPartNumber)) ? [] : [{ path: ["partNumbers"], message: "Two of the part numbers are the same but for punctuation." }];
  return [...parts, ...pinProblems(data), ...connectorProblems(data), ...healthyProblems(data), ...transferProblems(data)];
}
