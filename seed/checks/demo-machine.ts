import { expectOfEntry } from "@/lib/catalogue/expect-of-entry";
import type { MeterSpec } from "@/lib/diagnosis";
import { seedEntries, type SeedEntry } from "../catalogue";
import { SEED_MACHINES } from "../machines/machines";
import { SEED_METERS } from "../machines/meters";
import type { MachineTruth } from "./netlist";
import { DEMO_CHECKS, type DemoCheck } from "./specs";

/** Each carries the same meter all year; Joram has the van's. */
const METER_OF = { tilda: 0, joram: 2, edda: 1, tomas: 0, wim: 0 } as const;

export interface DemoMachine {
  readonly entry: SeedEntry;
  readonly machine: (typeof SEED_MACHINES)[number] | null;
  readonly meter: { readonly id: string; readonly name: string; readonly spec: MeterSpec };
  readonly truth: MachineTruth;
}

/** A device on the bench hangs on a 12 V supply. */
const BENCH_VOLTS = 12;
/** An alternator or a charger holds a battery a little above its name. */
const CHARGED = 1.06;

function theOne<T>(list: readonly T[], what: string): T {
  const [only, more] = list;
  if (only === undefined || more !== undefined) throw new Error(`${what} names ${list.length} things, not one`);
  return only;
}

/**
 * What a demo check stood before: entry, machine, meter and the truth behind the readings.
 * @throws Error when the demo catalogue or register no longer holds them
 */
export function demoMachine(check: DemoCheck): DemoMachine {
  const entry = theOne(seedEntries().filter((e) => e.slug.startsWith(check.device)), check.device);
  const machine = check.machine === null ? null : theOne(SEED_MACHINES.filter((m) => m.fleetNumber === check.machine), check.machine);
  const meter = SEED_METERS[METER_OF[check.person]];
  if (!meter) throw new Error("the demo register has no such meter");
  const device = expectOfEntry(entry.data);
  return { entry, machine, meter, truth: { device, fault: check.fault, batteryVolts: (machine?.batteryVolts ?? BENCH_VOLTS) * CHARGED } };
}

/** @throws Error when there is no demo check of this number */
export function demoCheck(number: number): DemoCheck {
  return theOne(DEMO_CHECKS.filter((c) => c.number === number), `demo check ${number}`);
}
