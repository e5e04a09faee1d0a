import { writeFileSync } from "node:fs";
import { DEMO_CHECKS } from "./specs";
import { takeReadings } from "./take-readings";

/**
 * Takes the readings of every demo check anew and writes runs.json. For whoever changes a demo check, the demo catalogue
 * or the circuit; `npm run seed` only reads the file, so that it needs no simulator.
 */
const runs: Record<string, unknown> = {};
for (const check of DEMO_CHECKS) runs[check.number] = await takeReadings(check);
const lines = Object.entries(runs).map(([number, readings]) => `  ${JSON.stringify(number)}: ${JSON.stringify(readings)}`);
writeFileSync(new URL("./runs.json", import.meta.url), `{\n${lines.join(",\n")}\n}\n`);
