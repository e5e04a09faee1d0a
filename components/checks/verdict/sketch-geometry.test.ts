import { describe, expect, it } from "vitest";
import { FAULT_CODES, type Fault } from "@/lib/diagnosis";
import { findingPoint, SKETCH, spread, wireY } from "./sketch-geometry";

const PINS = { supply: 1, ground: 2, signal: 3 } as const;
const at = (code: Fault["code"], pins?: Fault["pins"]) => findingPoint(pins ? { code, pins } : { code }, PINS);

describe("the place of a finding on the drawing", () => {
  it("is the part that it belongs to", () => {
    expect(at("contact-open", [2])).toEqual({ x: SKETCH.gap, y: wireY(2) });
    expect(at("supply-missing")).toEqual({ x: SKETCH.controller.right, y: wireY(1) });
    expect(at("output-dead")?.x).toBeGreaterThan(SKETCH.device.left);
    expect(at("wires-shorted", [1, 3])?.y).toBe((wireY(1) + wireY(3)) / 2);
    expect(at("none")).toBeNull();
  });

  it("lies inside the drawing for every finding, with and without known pins", () => {
    for (const code of FAULT_CODES) for (const pins of [PINS, null]) {
      const point = findingPoint({ code }, pins);
      if (code === "none") continue;
      expect(point?.x).toBeGreaterThan(0);
      expect(point?.x).toBeLessThan(SKETCH.width);
    }
  });

  it("is moved aside where another mark lies, so that both can be read", () => {
    const points = spread([at("wire-open", [1]), at("wire-resistive", [1]), at("wires-swapped", [1, 2]), at("none")]);
    const [a, b, c, none] = points;
    expect(none).toBeNull();
    for (const [one, two] of [[a, b], [a, c], [b, c]]) {
      expect(Math.max(Math.abs((one?.x ?? 0) - (two?.x ?? 0)), Math.abs((one?.y ?? 0) - (two?.y ?? 0)))).toBeGreaterThanOrEqual(30);
    }
  });
});
