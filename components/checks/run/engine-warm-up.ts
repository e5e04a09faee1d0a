import type { Reading, Setup } from "@/lib/diagnosis";
import type { EngineClient } from "./engine-client";

/** A made-up track of 5 kΩ on a made-up machine: nobody's check, and never shown. */
const SETUP: Setup = { pins: ["1", "2", "3"] };
const READINGS: readonly Reading[] = [
  ["res:device:1-2@rest", 5010], ["res:device:2-3@rest", 1020], ["res:device:2-3@full", 4180], ["volt:harness:1-gnd", 5.01], ["volt:mated:3-gnd@rest", 0.98],
];

/**
 * Lets the browser compile the engine before the first reading comes in: a script that has not run yet takes two to three
 * times as long. One step after the other, with ever more readings, as in a check.
 * @param wanted asked before each step: a check that has begun must not wait for more than one of them
 */
export async function warmUp(engine: EngineClient, wanted: () => boolean): Promise<void> {
  for (let taken = 0; taken <= READINGS.length && engine.apart() && wanted(); taken += 1) {
    await engine.ask({ task: "assess" }, SETUP, READINGS.slice(0, taken));
  }
}
