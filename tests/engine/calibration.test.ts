import { beforeAll, describe, expect, it } from "vitest";
import { drawer } from "../support/draw";
import { drawMachine, drawSetup } from "../support/draw-machine";
import { calibrationError, reliability, reliabilityTable, verdictOn, type Verdict } from "./calibration";
import { SLOW } from "../support/slow";

/**
 * As right as it says: machines drawn from the engine's own ranges and priors, so that its chances should come true (probability
 * theory). `npm run calibration` does the same for 2,000 machines. A hundred and fifty leave an error of about 0.015 by chance alone.
 */
const DRAWS = 150, MOST_ERROR = 0.03;

describe(`${DRAWS} drawn machines`, () => {
  let verdicts: Verdict[] = [];

  beforeAll(() => {
    const draw = drawer(90_210);
    verdicts = Array.from({ length: DRAWS }, (_, i) => verdictOn(drawMachine(drawSetup(draw, i % 2 === 1), draw)));
    process.stdout.write(`${reliabilityTable("drawn machines", verdicts)}\n`);
  }, SLOW.timeout);

  it(`have an expected calibration error of ${MOST_ERROR} or less`, () => {
    expect(calibrationError(verdicts)).toBeLessThanOrEqual(MOST_ERROR);
  });
});

describe("the measure itself", () => {
  const verdict = (said: number, right: boolean): Verdict => ({ said, right, readings: 1, inSet: right, truth: "", top: "" });

  it("is nought where 3 of 4 are right at 0.75 (computed)", () => {
    expect(calibrationError([true, true, true, false].map((right) => verdict(0.75, right)))).toBeCloseTo(0, 12);
  });

  it("weighs each bin by its share: half at 1.00 all wrong, half at 0.5 half right (computed)", () => {
    const list = [verdict(1, false), verdict(1, false), verdict(0.5, true), verdict(0.5, false)];
    expect(calibrationError(list)).toBeCloseTo(0.5, 12);
    expect(reliability(list).map(({ count }) => count)).toEqual([2, 0, 0, 0, 2]);
  });
});
