import type { Fault, FaultCode, Kind, PinNumber } from "@/lib/diagnosis";

/** Where a finding may be: nowhere in particular, at one cavity, or at two. */
type Places = "none" | "one" | "two";

interface Outcome { readonly places: Places; /** Kinds that can have it; every kind when absent. */ readonly only?: readonly Kind[] }

const ELECTRONIC: readonly Kind[] = ["pwm", "voltage"];

/** The findings of the engine, with their places and the kinds they belong to; a test holds this against the engine. */
export const OUTCOMES: Readonly<Record<FaultCode, Outcome>> = {
  none: { places: "none" },
  "wire-open": { places: "one" }, "wire-resistive": { places: "one" }, "short-to-ground": { places: "one" }, "short-to-battery": { places: "one" },
  "wires-shorted": { places: "two" }, "wires-swapped": { places: "two" },
  "contact-open": { places: "one" }, "connector-damp": { places: "two" },
  "supply-missing": { places: "none" }, "pull-missing": { places: "none" },
  "wiper-open": { places: "none", only: ["potentiometer"] }, "track-open": { places: "none", only: ["potentiometer"] }, "track-worn": { places: "none", only: ["potentiometer"] },
  "output-dead": { places: "none", only: ELECTRONIC }, "output-stuck-high": { places: "none", only: ELECTRONIC }, "output-stuck-low": { places: "none", only: ELECTRONIC },
};

const PINS: readonly PinNumber[] = [1, 2, 3];
const PAIRS: readonly (readonly PinNumber[])[] = [[1, 2], [1, 3], [2, 3]];

/** One finding at its place as one text, e.g. "wire-open:2", "wires-swapped:1,3", "none". */
export function outcomeId(fault: Fault): string {
  return fault.pins && fault.pins.length > 0 ? `${fault.code}:${fault.pins.join(",")}` : fault.code;
}

function atEachPlace(code: FaultCode): readonly Fault[] {
  const { places } = OUTCOMES[code];
  if (places === "none") return [{ code }];
  return places === "one" ? PINS.map((pin) => ({ code, pins: [pin] })) : PAIRS.map((pins) => ({ code, pins }));
}

/** What may be chosen, by where to look for it. */
export const OUTCOME_GROUPS: readonly { readonly title: string; readonly faults: readonly Fault[] }[] = ([
  { title: "Nothing wrong", codes: ["none"] },
  { title: "Wires", codes: ["wire-open", "wire-resistive", "short-to-ground", "short-to-battery", "wires-shorted", "wires-swapped"] },
  { title: "Connector", codes: ["contact-open", "connector-damp"] },
  { title: "Controller", codes: ["supply-missing", "pull-missing"] },
  { title: "Device", codes: ["wiper-open", "track-open", "track-worn", "output-dead", "output-stuck-high", "output-stuck-low"] },
] as const satisfies readonly { title: string; codes: readonly FaultCode[] }[]).map(({ title, codes }) => ({ title, faults: codes.flatMap(atEachPlace) }));

const BY_ID: ReadonlyMap<string, Fault> = new Map(OUTCOME_GROUPS.flatMap((group) => group.faults).map((fault) => [outcomeId(fault), fault]));

/** The finding that a text stands for, or null when there is none like it. */
export function outcomeOf(id: string): Fault | null {
  return BY_ID.get(id) ?? null;
}

/** Can a device of this kind have this finding? */
export function isOfKind(code: FaultCode, kind: Kind): boolean {
  const { only } = OUTCOMES[code];
  return !only || only.includes(kind);
}
