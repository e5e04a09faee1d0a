import { describe, expect, it } from "vitest";
import { seedEntries } from "../../seed/catalogue";
import type { EntryData } from "./entry-data";
import { healthyRows } from "./healthy-rows";

const entries = seedEntries().map(({ data }) => data);
const row = (data: EntryData, name: string) => healthyRows(data).find((one) => one.name === name)?.value.replaceAll("\u00a0", " ");

function pwmOf(duty: { rest: number; full: number }, volts: number): EntryData {
  const pwm = entries.find(({ kind }) => kind === "pwm");
  if (!pwm) throw new Error("no PWM entry");
  return { ...pwm, supply: { type: "fixed", volts }, healthy: { ...pwm.healthy, duty } };
}

describe("healthy readings", () => {
  it("says what DC volts show of pulses: amplitude times duty", () => {
    // Source: mean of a two-level wave; 24 V at 50 % reads about 12 V (common practice).
    expect(row(pwmOf({ rest: 0.1, full: 0.5 }, 24), "Mean of the pulses")).toBe("2.4 V at rest, 12 V at full travel");
  });

  it("gives no mean where the swing is not known", () => {
    expect(row({ ...pwmOf({ rest: 0.1, full: 0.9 }, 5), supply: { type: "battery", minVolts: 9, maxVolts: 32 } }, "Mean of the pulses")).toBeUndefined();
  });

  it("states the standard's limit for listed gauges and nothing for others", () => {
    const [entry] = entries;
    if (!entry) throw new Error("no entry");
    const withGauge = (gaugeMm2: number): EntryData => ({ ...entry, pins: entry.pins.map((pin) => ({ ...pin, gaugeMm2 })) });
    // Source: IEC 60228 class 5, read in two reproductions: 26.0 ohm per km for 0.75 mm².
    expect(row(withGauge(0.75), "Wires")).toBe("0.75 mm²: 26 mΩ a metre at most");
    expect(row(withGauge(0.35), "Wires")).toBeUndefined();
  });

  it("names a reading for every entry, each with the place of the leads", () => {
    for (const entry of entries) for (const { value, how } of healthyRows(entry)) expect(`${value} ${how}`).not.toMatch(/undefined|NaN|\?/);
  });
});
