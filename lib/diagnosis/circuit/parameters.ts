import type { Expect, FaultCode } from "../types";
import { ln } from "../numerics";

/** What is not known of device, wires and controller: places in the parameter vector. */
export const P = {
  battery: 0, supply: 1, supplySource: 2, supplyBleed: 3, rail: 4, pull: 5, railOff: 6, fault: 7, batteryOff: 18, clamp: 19,
  rest: 8, full: 9,
  // potentiometer
  track: 10, wiper: 11,
  // electronic devices
  internal: 10, leak: 11, load: 12, driveLow: 13, high: 14, frequency: 15, dropSupply: 16, dropSignal: 17,
} as const;
export const PARAMETER_COUNT = 20;

/** How a device's output works; the potentiometer is its own. */
export type Family = "potentiometer" | "open-collector" | "push-pull" | "voltage";
/** How a controller holds its signal input: down to ground, up to a rail of its own, or up to the supply it gives. */
export type Pull = "up" | "up-to-supply" | "down";

/** Gaussian ranges in the logarithm (ratio scale) or straight; `mean` and `sd` are of that scale. */
export interface Ranges { readonly mean: Float64Array; readonly sd: Float64Array; readonly log: Uint8Array }

class RangeBuilder {
  readonly mean = new Float64Array(PARAMETER_COUNT);
  readonly sd = new Float64Array(PARAMETER_COUNT);
  readonly log = new Uint8Array(PARAMETER_COUNT);

  /** Middle value and factor that one standard deviation spans, e.g. (3000, 2): 1.5 k to 6 k. */
  ratio(index: number, middle: number, factor: number): this {
    this.mean[index] = ln(middle); this.sd[index] = ln(factor); this.log[index] = 1;
    return this;
  }

  straight(index: number, middle: number, sd: number): this {
    this.mean[index] = middle; this.sd[index] = sd; this.log[index] = 0;
    return this;
  }
}

/** Ohms of a fault, where it has any: middle and factor. Common practice: joints corrode over decades of ohms, shorts are near 1 ohm, a wet connector leaks 10 k to 1 M. */
const FAULT_OHMS: Partial<Record<FaultCode, readonly [number, number]>> = {
  "wire-resistive": [1500, 6.5], "short-to-ground": [0.8, 2.3], "short-to-battery": [0.8, 2.3], "wires-shorted": [1, 2.2], "connector-damp": [100_000, 3],
};

/** Ranges for one way the machine may be built; `expect` narrows what a catalogue entry states. */
export function rangesFor(family: Family, pull: Pull, fault: FaultCode, expect?: Expect): Ranges {
  const r = new RangeBuilder();
  controllerRanges(r, family, pull, expect);
  const [ohms, factor] = FAULT_OHMS[fault] ?? [1, 2];
  r.ratio(P.fault, ohms, factor);
  if (family === "potentiometer") potentiometerRanges(r, expect);
  else electronicRanges(r, family, expect);
  return r;
}

/** Which role's pin goes to a tap of the track (0 supply, 1 ground), and in which position the wiper stands past it (0 rest, 1 full travel). */
export interface Tap { readonly role: 0 | 1; readonly position: 0 | 1 }

/** The same for a potentiometer with a tap: the wiper stands past it by some part of the track between supply and ground. */
export function tappedRanges(pull: Pull, fault: FaultCode, tap: Tap): Ranges {
  const r = rangesFor("potentiometer", pull, fault), place = tap.position === 0 ? P.rest : P.full;
  r.mean[place] = tap.role === 1 ? -0.5 : 1.5;
  r.sd[place] = 0.4;
  return r;
}

function controllerRanges(r: RangeBuilder, family: Family, pull: Pull, expect?: Expect): void {
  const volts = expect?.supplyVolts;
  r.ratio(P.battery, 18, 1.7);
  // A supply that comes from the battery is the battery's volts less next to nothing: see suppliedByBattery.
  if (typeof volts === "number") r.ratio(P.supply, volts, 1.012); else r.ratio(P.supply, 9, 1.9);
  r.ratio(P.supplySource, 1, 1.8).ratio(P.supplyBleed, 7000, 3.3).ratio(P.railOff, 2000, 1.8).ratio(P.batteryOff, 4.5, 1.35);
  if (family === "open-collector") r.ratio(P.rail, 9, 2).ratio(P.pull, 3500, 2.3);
  else if (family === "push-pull") r.ratio(P.rail, 5, 1.6).ratio(P.pull, pull === "down" ? 50_000 : 20_000, 3);
  else r.ratio(P.rail, 6, 1.5).ratio(P.pull, 180_000, 2.3);
}

function potentiometerRanges(r: RangeBuilder, expect?: Expect): void {
  const e = expect?.kind === "potentiometer" ? expect : undefined;
  if (e?.totalOhms) r.ratio(P.track, e.totalOhms + (e.endOhms ?? 0), 1 + (e.tolerancePercent ?? 20) / 100 / Math.sqrt(2)); else r.ratio(P.track, 4000, 3);
  // The wiper's own contact adds some tens of ohms to any resistor in series with it.
  if (e) r.ratio(P.wiper, (e.wiperSeriesOhms ?? 0) + 50, e.wiperSeriesOhms ? 1.12 : 1.8); else r.ratio(P.wiper, 200, 4.5);
  r.straight(P.rest, e?.signalRatio?.rest ?? 0.5, e?.signalRatio ? 0.013 : 0.33);
  r.straight(P.full, e?.signalRatio?.full ?? 0.5, e?.signalRatio ? 0.013 : 0.33);
}

function electronicRanges(r: RangeBuilder, family: Exclude<Family, "potentiometer">, expect?: Expect): void {
  r.ratio(P.internal, 50_000, 2.6).ratio(P.leak, family === "open-collector" ? 1.6e6 : 5e6, 1.9);
  r.ratio(P.load, 0.006, 1.5).ratio(P.driveLow, 45, 1.6).ratio(P.high, 6, 1.7).ratio(P.frequency, expect?.frequencyHz ?? 430, expect?.frequencyHz ? 1.035 : 2.2);
  r.straight(P.dropSupply, 0.3, 0.05).straight(P.dropSignal, 0.5, 0.12).ratio(P.clamp, 60, 2.5);
  if (family === "voltage") signalSpan(r, expect?.signalVolts, 2.5, 1.7, 0.035);
  else signalSpan(r, expect?.duty, 0.5, 0.36, 0.008);
}

function signalSpan(r: RangeBuilder, stated: { rest: number; full: number } | undefined, middle: number, wide: number, narrow: number): void {
  r.straight(P.rest, stated?.rest ?? middle, stated ? narrow : wide).straight(P.full, stated?.full ?? middle, stated ? narrow : wide);
}
