import { cavityLabels } from "@/lib/catalogue/expect-of-entry";
import { assess, parseCheck, type Reading, type Setup } from "@/lib/diagnosis";
import { drawer } from "@/tests/support/draw";
import { demoMachine } from "./demo-machine";
import { readMeter } from "./read-meter";
import { trueValue } from "./simulate-readings";
import type { DemoCheck } from "./specs";

/** Nobody stands at a machine for more. */
const MOST_READINGS = 20;
/** Above 5.9 a slipped point would not get past the bounds of a reading, volts being the tightest. */
const SLIP_FROM = 0.5, SLIP_TO = 5.9;
/** A slip at the very start would contradict nothing yet. */
const SOUND_FIRST = 2;

const slips = (value: Reading[1]): value is number => typeof value === "number" && value > SLIP_FROM && value < SLIP_TO;

/**
 * The readings of one demo check as a technician would have taken them: the engine says which comes next, the
 * simulated machine and the meter say what it is.
 */
export async function takeReadings(check: DemoCheck): Promise<readonly Reading[]> {
  const { entry, meter, truth } = demoMachine(check);
  const setup: Setup = { pins: cavityLabels(entry.data), meter: meter.spec, ...(check.known ? { expect: truth.device } : {}) };
  const draw = drawer(check.number);
  const readings: Reading[] = [];
  let slipped = !check.slipped;
  while (readings.length < (check.stoppedAfter ?? MOST_READINGS)) {
    const standing = assess(setup, readings);
    if (standing.state === "invalid-input") throw new Error(`demo check ${check.number}: ${standing.message}`);
    const code = standing.next[0]?.check;
    const spec = code ? parseCheck(code) : null;
    if (!spec || (standing.done && readings.length > 0)) break;
    const shown = readMeter(spec, await trueValue(truth, spec, meter.spec), meter.spec, draw);
    const slip = !slipped && readings.length >= SOUND_FIRST && slips(shown);
    slipped ||= slip;
    readings.push([spec.code, slip ? Number((shown * 10).toPrecision(6)) : shown]);
  }
  return readings;
}
