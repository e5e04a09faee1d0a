import type { Expect, FaultCode } from "../types";
import { exp, ln } from "../numerics";

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

/** How an unknown is measured: straight, by ratios (its logarithm), or as a share of a whole (the logarithm of share to rest). */
const STRAIGHT = 0, RATIO = 1, SHARE = 2;

/** Gaussian ranges of every unknown; `mean` and `sd` are of its scale. */
export interface Ranges { readonly mean: Float64Array; readonly sd: Float64Array; readonly scale: Uint8Array }

/** Log of share to rest beyond which a share is as good as nothing or all. */
const MOST_ODDS = 12;

/** Physical value of an unknown that stands `z` standard deviations from the middle of its range. */
export function physicalValue({ mean, sd, scale }: Ranges, index: number, z: number): number {
  const v = mean[index]! + sd[index]! * z;
  if (scale[index] === RATIO) return exp(v);
  return scale[index] === STRAIGHT ? v : 1 / (1 + exp(-Math.min(MOST_ODDS, Math.max(-MOST_ODDS, v))));
}

/** Standard deviation of the log of share to rest where nothing is known: nearly even from 0.02 to 0.98. */
const ANY_SHARE = 1.6;
/** Nearest to nothing or all that a stated share is taken to be. */
const LEAST_SHARE = 0.01;

class RangeBuilder {
  readonly mean = new Float64Array(PARAMETER_COUNT);
  readonly sd = new Float64Array(PARAMETER_COUNT);
  readonly scale = new Uint8Array(PARAMETER_COUNT);

  /** Middle value and factor that one standard deviation spans, e.g. (3000, 2): 1.5 k to 6 k. */
  ratio(index: number, middle: number, factor: number): this {
    this.mean[index] = ln(middle); this.sd[index] = ln(factor); this.scale[index] = RATIO;
    return this;
  }

  straight(index: number, middle: number, sd: number): this {
    this.mean[index] = middle; this.sd[index] = sd; this.scale[index] = STRAIGHT;
    return this;
  }

  /** A share of a whole, 0..1: where in between when nothing is known of it (`null`), or a middle and a standard deviation. */
  share(index: number, stated: number | null, sd: number): this {
    const middle = Math.min(1 - LEAST_SHARE, Math.max(LEAST_SHARE, stated ?? 0.5));
    this.mean[index] = ln(middle / (1 - middle)); this.sd[index] = stated === null ? ANY_SHARE : sd / (middle * (1 - middle)); this.scale[index] = SHARE;
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

/** Families with the same name here have the same ranges of what the controller holds. */
export function controllerClass({ family }: { readonly family: Family }): string {
  return family === "open-collector" || family === "push-pull" ? family : "analogue";
}

/** Which role's pin goes to a tap of the track (0 supply, 1 ground), and in which position the wiper stands past it (0 rest, 1 full travel). */
export interface Tap { readonly role: 0 | 1; readonly position: 0 | 1 }

/** The same for a potentiometer with a tap: the wiper stands past it by some part of the track between supply and ground. */
export function tappedRanges(pull: Pull, fault: FaultCode, tap: Tap): Ranges {
  const r = rangesFor("potentiometer", pull, fault), place = tap.position === 0 ? P.rest : P.full;
  r.mean[place] = tap.role === 1 ? -0.5 : 1.5;
  r.sd[place] = 0.4;
  r.scale[place] = STRAIGHT;
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
  r.share(P.rest, e?.signalRatio?.rest ?? null, 0.013).share(P.full, e?.signalRatio?.full ?? null, 0.013);
}

function electronicRanges(r: RangeBuilder, family: Exclude<Family, "potentiometer">, expect?: Expect): void {
  r.ratio(P.internal, 50_000, 2.6).ratio(P.leak, family === "open-collector" ? 1.6e6 : 5e6, 1.9);
  r.ratio(P.load, 0.006, 1.5).ratio(P.driveLow, 45, 1.6).ratio(P.high, 6, 1.7).ratio(P.frequency, expect?.frequencyHz ?? 430, expect?.frequencyHz ? 1.035 : 2.2);
  r.straight(P.dropSupply, 0.3, 0.05).straight(P.dropSignal, 0.5, 0.12).ratio(P.clamp, 60, 2.5);
  const { signalVolts: volts, duty } = expect ?? {};
  if (family === "voltage" && volts) r.straight(P.rest, volts.rest, 0.035).straight(P.full, volts.full, 0.035);
  // An output that is not said to swing below ground does not.
  else if (family === "voltage") r.ratio(P.rest, 2, 2.2).ratio(P.full, 2, 2.2);
  else r.share(P.rest, duty?.rest ?? null, 0.008).share(P.full, duty?.full ?? null, 0.008);
}
