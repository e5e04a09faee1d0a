import type { MeterSpec } from "@/lib/diagnosis";

const id = (number: number) => `01J0METER${String(number).padStart(17, "0")}`;

/** Limits of error as their sheets give them: percent of reading and a fixed part. The first is the bench meter. */
export const SEED_METERS: readonly { readonly id: string; readonly name: string; readonly spec: MeterSpec }[] = [
  {
    id: id(1), name: "Workshop meter, 6000 counts",
    spec: {
      counts: 6000, ohms: { percent: 0.9, counts: 2, leadOhms: 0.25, maxOhms: 60e6 }, volts: { percent: 0.5, fixedVolts: 0.004, inputOhms: 10e6 },
      hertz: { percent: 0.1 }, duty: { percent: 0.5, fixed: 0.002 }, triggerVolts: 0.8,
    },
  },
  {
    id: id(2), name: "Test-bench meter, 20 000 counts",
    spec: {
      counts: 20_000, ohms: { percent: 0.2, counts: 5, leadOhms: 0.1, maxOhms: 50e6 }, volts: { percent: 0.05, fixedVolts: 0.002, inputOhms: 10e6 },
      hertz: { percent: 0.02 }, duty: { percent: 0.2, fixed: 0.001 }, triggerVolts: 0.5,
    },
  },
  {
    id: id(3), name: "Van meter, 2000 counts",
    spec: {
      counts: 2000, ohms: { percent: 1.2, counts: 5, leadOhms: 0.5, maxOhms: 20e6 }, volts: { percent: 1, fixedVolts: 0.02, inputOhms: 10e6 },
      hertz: { percent: 0.5 }, duty: { percent: 1, fixed: 0.005 }, triggerVolts: 1.5,
    },
  },
];
