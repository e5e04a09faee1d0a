import { describe, expect, it } from "vitest";
import { assess, type Reading } from "@/lib/diagnosis";
import machines from "../e2e/data/machines.json";

/**
 * Common practice: a three-wire powered PWM sensor tested on ohms as if it were a potentiometer looks dead, and the same housing
 * has been sold with either inside. Readings from the bench, solved by a circuit simulator.
 */
const ohms = (name: string): Reading[] => {
  const { readings } = machines.find((machine) => machine.name === name) ?? { readings: {} };
  return Object.entries(readings).filter(([check]) => check.startsWith("res:device:")) as Reading[];
};

function standing(name: string) {
  const answer = assess({ pins: ["1", "2", "3"] }, ohms(name));
  if (answer.state === "invalid-input") throw new Error(answer.message);
  return answer;
}

describe("ohms alone on a parted device", () => {
  it("says that a sound PWM sensor is electronic, and does not call it dead", () => {
    const { kinds, faults } = standing("sound PWM sensor");
    expect(kinds.find(({ kind }) => kind === "potentiometer")?.p).toBeLessThan(0.05);
    const dead = faults.filter(({ code }) => ["output-dead", "track-open", "wiper-open"].includes(code)).reduce((sum, { p }) => sum + p, 0);
    expect(faults[0]?.code).toBe("none");
    expect(dead).toBeLessThan(0.2);
  });

  it("says that the potentiometer is one", () => {
    expect(standing("potentiometer with an open wire").kinds[0]?.kind).toBe("potentiometer");
  });
});
