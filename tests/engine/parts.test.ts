import { describe, expect, it, vi } from "vitest";
import { assess, DEFAULT_METER, type MeterSpec, type Reading } from "@/lib/diagnosis";
import type { Candidate } from "@/lib/diagnosis/circuit/candidate";
import { P, PARAMETER_COUNT } from "@/lib/diagnosis/circuit/parameters";
import { candidatesForEntry, candidatesForUnknown } from "@/lib/diagnosis/inference/candidates";
import { fitCandidate } from "@/lib/diagnosis/inference/fit";
import { evidenceOf } from "@/lib/diagnosis/inference/misfit";
import { observe } from "@/lib/diagnosis/inference/observe";
import { PartFits } from "@/lib/diagnosis/inference/part-fits";
import { benchCases, everyNth } from "../support/bench";
import { drawer } from "../support/draw";
import { shuffled } from "../support/random-readings";
import { SLOW } from "../support/slow";

/**
 * Source: probability theory. What has no unknown in common is independent, so the chance of all readings of a parted,
 * unpowered machine is the product of the chances of its parts; the machines are the bench's.
 */
const UNPOWERED = /^(res|fit):/;
/** A climb stops where little is to be gained, natural-log units; two of them may differ by that for every part. */
const NEARLY = 0.15;
/** Evidence of all readings in one fit, on the peak that `near` is on. */
const whole = (c: Candidate, readings: readonly Reading[], near: Float64Array) => fitCandidate(c, evidenceOf(observe(readings, DEFAULT_METER), DEFAULT_METER), near).logEvidence;
const DEVICE_UNKNOWNS = [P.rest, P.full, P.track, P.wiper, P.dropSupply, P.dropSignal, P.clamp];
/** A start up to two standard deviations from the middle of every range of the device. */
function drawnStart(draw: () => number): Float64Array {
  const z = new Float64Array(PARAMETER_COUNT);
  for (const p of DEVICE_UNKNOWNS) z[p] = 4 * (draw() - 0.5);
  return z;
}
/** What is less likely than one in a million is not compared. */
const COMPARED = 14;

describe("parts fitted apart", SLOW, () => {
  it.each(everyNth(benchCases(), 24).map((c) => [c.id, c] as const))("add up to the whole: %s", (_, c) => {
    const draw = drawer(c.id.length + Number(c.id.slice(2)));
    const readings = shuffled(Object.entries(c.readings).filter(([check]) => UNPOWERED.test(check)), draw).slice(0, 9);
    const list = c.setup.expect ? candidatesForEntry(c.setup.expect) : candidatesForUnknown(undefined);
    const fits = new PartFits(observe(readings, DEFAULT_METER), DEFAULT_METER), apart = list.map((one) => fits.fit(one, -Infinity));
    const best = Math.max(...apart.map((fit) => fit.logEvidence));
    let compared = 0;
    list.forEach((one, i) => {
      const { logEvidence, z } = apart[i]!;
      if (logEvidence < best - COMPARED) return;
      expect(Math.abs(logEvidence - whole(one, readings, z)), `${one.hypothesis.id} ${one.pull} ${one.breakEnd}`).toBeLessThan(NEARLY);
      compared += 1;
    });
    expect(compared).toBeGreaterThan(0);
  });

  it.each(everyNth(benchCases(), 8).map((c) => [c.id, c] as const))("find the highest peak that a dozen drawn starts find: the device of %s", (_, c) => {
    const draw = drawer(Number(c.id.slice(2))), readings = shuffled(Object.entries(c.readings).filter(([check]) => check.startsWith("res:device")), draw).slice(0, 4);
    const observations = observe(readings, DEFAULT_METER), fits = new PartFits(observations, DEFAULT_METER), evidence = evidenceOf(observations, DEFAULT_METER);
    const list = c.setup.expect ? candidatesForEntry(c.setup.expect) : candidatesForUnknown(undefined);
    const devices = [...new Map(list.map((one) => [one.deviceKey, one])).values()], found = devices.map((one) => fits.fit(one, -Infinity).logEvidence);
    const best = Math.max(...found);
    devices.forEach((one, i) => {
      const drawn = Array.from({ length: 12 }, () => fitCandidate(one, evidence, drawnStart(draw)).logEvidence);
      if (Math.max(found[i]!, ...drawn) > best - COMPARED) expect(Math.max(...drawn), one.deviceKey).toBeLessThan(found[i]! + NEARLY);
    });
  });

  it("are the same whether or not they were first asked for with a reading left out", async () => {
    const readings = Object.entries(benchCases()[0]!.readings).filter(([check]) => /^(res|volt):harness/.test(check)).slice(0, 7);
    const fresh = async (leftOutFirst: boolean) => {
      vi.resetModules();
      const own = await import("@/lib/diagnosis/inference/part-fits"), fits = new own.PartFits(observe(readings, DEFAULT_METER), DEFAULT_METER), list = candidatesForUnknown(undefined);
      if (leftOutFirst) for (const one of list) fits.without(0).fit(one, -Infinity);
      return list.map((one) => fits.fit(one, -Infinity).logEvidence);
    };
    expect(await fresh(true)).toStrictEqual(await fresh(false));
  });

  it("leave no trace of another meter", () => {
    const [c] = benchCases(), coarse: MeterSpec = { ...DEFAULT_METER, ohms: { ...DEFAULT_METER.ohms, percent: 20 }, volts: { ...DEFAULT_METER.volts, percent: 10 } };
    const readings = Object.entries(c!.readings).slice(0, 12), setup = { pins: c!.setup.pins, meter: coarse };
    const first = assess(setup, readings), fine = assess({ pins: c!.setup.pins }, readings);
    expect(fine).not.toStrictEqual(first);
    expect(assess(setup, readings)).toStrictEqual(first);
    // Of a parted, unpowered machine everything is fitted in parts: what the one meter's fits left behind would be all that the other's belief is made of.
    const parted = Object.entries(c!.readings).filter(([check]) => UNPOWERED.test(check)).slice(0, 6);
    const faults = (meter?: MeterSpec) => { const a = assess({ pins: c!.setup.pins, ...(meter ? { meter } : {}) }, parted); return a.state === "invalid-input" ? [] : a.faults; };
    const sharp = faults();
    expect(faults(coarse)).not.toStrictEqual(sharp);
    expect(faults()).toStrictEqual(sharp);
  });
});
