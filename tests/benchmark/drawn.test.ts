import { describe, expect, it } from "vitest";
import { parseCheck } from "@/lib/diagnosis";
import { benchCases } from "../support/bench";
import { drawer } from "../support/draw";
import { randomOrder, readAnew } from "./drawn";

const [c] = benchCases();
if (!c) throw new Error("the bench is empty");

describe("a random order", () => {
  it("holds every check that the machine can be given, once", () => {
    const order = randomOrder(c.readings, drawer(1));
    expect([...order].sort()).toEqual(Object.keys(c.readings).filter((check) => parseCheck(check)).sort());
  });

  it("is the same for a seed, another for another", () => {
    expect(randomOrder(c.readings, drawer(1))).toEqual(randomOrder(c.readings, drawer(1)));
    expect(randomOrder(c.readings, drawer(1))).not.toEqual(randomOrder(c.readings, drawer(2)));
  });

  it("puts each of three checks first about as often", () => {
    const three = { "volt:battery": 12, "res:wire:1": 0.3, "fit:contact:2": "grips" } as const, first = new Map<string, number>(), draw = drawer(3);
    for (let i = 0; i < 3000; i++) {
      const [check = ""] = randomOrder(three, draw);
      first.set(check, (first.get(check) ?? 0) + 1);
    }
    // From a third of 3,000 by less than four standard deviations of a binomial: sqrt(3000 x 1/3 x 2/3) = 25.8
    for (const check of Object.keys(three)) expect(Math.abs((first.get(check) ?? 0) - 1000)).toBeLessThan(104);
  });
});

describe("a machine read anew", () => {
  it("has every number within 0.1 % and every word as it was", () => {
    const anew = readAnew(c, drawer(7));
    let moved = 0;
    for (const [check, was] of Object.entries(c.readings)) {
      const is = anew.readings[check];
      if (typeof was === "number" && typeof is === "number") {
        expect(Math.abs(is - was)).toBeLessThanOrEqual(0.001_000_1 * Math.abs(was));
        if (is !== was) moved += 1;
      } else expect(is).toBe(was);
    }
    expect(moved).toBeGreaterThan(10);
  });
});
