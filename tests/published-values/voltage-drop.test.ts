import { describe, expect, it } from "vitest";
import { DEFAULT_METER, meterLimit } from "@/lib/diagnosis/meter";
import { NodalNetwork } from "@/lib/diagnosis/network/solve";

/** Volts lost over a joint in the ground wire of a sensor that takes 10 mA from 5 V. */
function drop(jointOhms: number): number {
  const net = new NodalNetwork(2);
  net.reset(2);
  net.source(1, 0, 5, 1e-3);
  net.resistor(1, 2, 500);
  net.resistor(2, 0, jointOhms);
  net.solve();
  return net.volts[2] ?? NaN;
}

describe("voltage drop under load", () => {
  // Source: common practice of the trade (0.1 V for a ground or joint, 0.2 V for a wire); ohms computed from the current.
  it("the 0.1 V allowed in a ground joint is about ten ohms and 2 % of the span at a sensor's 10 mA", () => {
    expect(drop(10)).toBeCloseTo(0.1, 2);
    expect(drop(10) / 5).toBeCloseTo(0.02, 3);
  });

  it("a joint of ten ohms is above the meter's limit of error at that voltage, one of a tenth of an ohm is not", () => {
    expect(drop(10)).toBeGreaterThan(meterLimit({ unit: "volt" }, drop(10)));
    expect(drop(0.1)).toBeLessThan(meterLimit({ unit: "volt" }, drop(0.1)));
  });

  it("ohms at the same joint, parted, cannot see less than the leads' own share", () => {
    expect(meterLimit({ unit: "ohm" }, 0.1)).toBeGreaterThan(DEFAULT_METER.ohms.leadOhms);
  });
});
