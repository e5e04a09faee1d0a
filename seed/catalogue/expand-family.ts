import { connectorShape } from "@/lib/catalogue/connector-shapes";
import { supplyWords } from "@/lib/catalogue/supply-words";
import type { ConnectorShape, EntryData, EntryPin, HealthyReadings, RestFull, TransferTable } from "@/lib/catalogue/entry-data";
import { CAUTIONS } from "./cautions";
import type { Curve, Family, Variant } from "./family";

/** Share of the value's span at a share of the signal's travel; strictly rising from 0 to 1. */
const CURVES: Readonly<Record<Curve, (x: number) => number>> = {
  straight: (x) => x,
  // A lever arm through 100 degrees, middle of travel at right angles to its rod.
  lever: (x) => 0.5 + Math.sin((x - 0.5) * (Math.PI * 5) / 9) / (2 * Math.sin((Math.PI * 5) / 18)),
  late: (x) => 0.35 * x + 0.65 * x * x,
  // Share of a lying cylinder's volume at a share of its height (segment of a circle).
  "lying-tank": (x) => (Math.acos(1 - 2 * x) - (1 - 2 * x) * Math.sqrt(Math.max(0, 4 * x * (1 - x)))) / Math.PI,
  // Rope on a drum: the outer layers take up more for each turn.
  drum: (x) => 0.86 * x + 0.14 * x * x,
};

function span(family: Family, healthy: HealthyReadings): RestFull {
  const found = { potentiometer: healthy.signalRatio, pwm: healthy.duty, voltage: healthy.signalVolts }[family.kind];
  if (!found) throw new Error(`${family.maker}: a ${family.kind} family without its signal's span`);
  return found;
}

const rounded = (value: number, step: number) => Number((Math.round(value / step) * step).toFixed(6));

function transferOf(family: Family, variant: Variant, healthy: HealthyReadings): TransferTable {
  const { rest, full } = span(family, healthy);
  const [low, high] = variant.values;
  const count = variant.points ?? family.points;
  const points = Array.from({ length: count }, (_, i) => {
    const x = i / (count - 1);
    return { signal: rounded(rest + x * (full - rest), 0.001), value: rounded(low + CURVES[family.curve](x) * (high - low), family.value.step) };
  }).sort((a, b) => a.signal - b.signal);
  const signal = family.kind === "voltage" ? { name: "Signal", unit: "volt" } : { name: family.kind === "pwm" ? "Duty" : "Wiper ratio", unit: "ratio" };
  return { signal, value: { name: family.value.name, unit: family.value.unit }, points };
}

function pinsOf(family: Family, variant: Variant, connector: ConnectorShape): EntryPin[] {
  return family.order.flatMap((role, i) => {
    const cavity = connector.cavities[i]?.label;
    return role && cavity ? [{ role, cavity, colour: family.colours[role], gaugeMm2: variant.gaugeMm2 ?? family.gaugeMm2 }] : [];
  });
}

function sourcesOf(family: Family, variant: Variant, supply: EntryData["supply"]): EntryData["sources"] {
  const [number, date] = family.sheet;
  const [reference, issued] = family.dataSheet;
  return [
    { title: `Workshop measurement sheet ${number}`, reference: `${variant.name}, on the bench at ${supplyWords(supply)}`, date },
    { title: `${family.maker} data sheet`, reference, date: issued },
  ];
}

/** The full entry of one variant of a family. */
export function expandVariant(family: Family, variant: Variant, storesNumber: string): EntryData {
  const connector = connectorShape(variant.connector ?? family.connector);
  if (!connector) throw new Error(`no connector shape ${variant.connector ?? family.connector}`);
  const healthy = { ...family.healthy, ...variant.healthy };
  const supply: EntryData["supply"] = typeof family.supply === "number"
    ? { type: "fixed", volts: family.supply }
    : { type: "battery", minVolts: family.supply[0], maxVolts: family.supply[1] };
  return {
    name: variant.name, maker: family.maker, partNumbers: [...variant.parts, storesNumber], kind: family.kind,
    senses: family.senses, movement: family.movement, supply, pins: pinsOf(family, variant, connector), connector, healthy,
    transfer: transferOf(family, variant, healthy), cautions: family.cautions.map((key) => CAUTIONS[key]), sources: sourcesOf(family, variant, supply),
  };
}
