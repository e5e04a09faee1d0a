import { encodeTime } from "ulid";
import type { Database } from "@/db/client";
import { checks, checkSteps } from "@/db/schema";
import { pinsInOrder } from "@/lib/catalogue/expect-of-entry";
import { judge } from "@/lib/checks/judge";
import type { RunSetup, RunStep } from "@/lib/checks/run";
import { machineState } from "@/lib/checks/run-state";
import { transition } from "@/lib/checks/run-transition";
import type { Verdict } from "@/lib/checks/verdict";
import { verdictColumns } from "@/lib/checks/verdict-columns";
import { parseCheck, type Reading } from "@/lib/diagnosis";
import { DEMO_PEOPLE } from "../people";
import { demoCheck, demoMachine } from "./demo-machine";
import runs from "./runs.json";
import { DEMO_CHECKS, type DemoCheck } from "./specs";

/** From one reading to the next, milliseconds. */
const PACE = 55_000;
/** From the last reading to the verdict. */
const LAST_LOOK = 20_000;

const RUNS = runs as unknown as Readonly<Record<string, readonly Reading[]>>;

/** A ULID that never changes: its time, then a number in place of chance. */
export const fixedId = (time: number, number: number): string => `${encodeTime(time, 10)}${String(number).padStart(16, "0")}`;

export function demoCheckId(check: DemoCheck): string {
  return fixedId(Date.parse(check.at), check.number);
}

function setupOf(check: DemoCheck): RunSetup {
  const { entry, machine, meter, truth } = demoMachine(check);
  const pins = pinsInOrder(entry.data);
  const [a, b, c] = pins;
  if (!a || !b || !c) throw new Error(`demo check ${check.number}: its device has not three pins`);
  return {
    cavityLabels: [a.cavity, b.cavity, c.cavity], wireColours: [a.colour, b.colour, c.colour], connector: entry.data.connector,
    meterId: meter.id, meter: meter.spec,
    ...(check.known ? { expect: truth.device, entryId: entry.id, entryVersionId: entry.versionId, entryName: entry.data.name } : { senses: entry.data.senses }),
    ...(machine ? { machineId: machine.id, machineName: `${machine.fleetNumber} ${machine.name}`, batteryVolts: machine.batteryVolts } : {}),
    ...(check.recheckOf === undefined ? {} : { recheckOf: demoCheckId(demoCheck(check.recheckOf)) }),
    ...(check.note ? { note: check.note } : {}),
  };
}

/** Each reading as a step, with a state step before it wherever the machine had to be changed for it. */
function stepsOf(check: DemoCheck): readonly RunStep[] {
  const steps: RunStep[] = [];
  let at = Date.parse(check.at);
  const head = () => ({ id: fixedId((at += PACE), 1000 + check.number), at: new Date(at).toISOString() });
  for (const [code, value] of RUNS[check.number] ?? []) {
    const spec = parseCheck(code);
    const way = spec ? transition(machineState(steps), spec.state) : null;
    if (way) steps.push({ ...head(), type: "state", ...way.end });
    steps.push({ ...head(), type: "reading", check: code, value, typed: String(value) });
  }
  return steps;
}

/** Verdicts by the demo check's number: judging takes a second for a long check, and the same steps always give the same. */
const judged = new Map<number, Verdict>();

function verdictOf(check: DemoCheck, setup: RunSetup, steps: readonly RunStep[]): Verdict {
  const verdict = judged.get(check.number) ?? judge({ setup, steps }).verdict;
  judged.set(check.number, verdict);
  return verdict;
}

function rowOf(check: DemoCheck, steps: readonly RunStep[]): typeof checks.$inferInsert {
  const setup = setupOf(check);
  const person = DEMO_PEOPLE.find((p) => p.email.startsWith(`${check.person}@`));
  if (!person) throw new Error(`demo check ${check.number}: no ${check.person} in the demo workshop`);
  const common = {
    id: demoCheckId(check), personId: person.id, entryId: setup.entryId, entryVersionId: setup.entryVersionId, machineId: setup.machineId,
    meterId: setup.meterId, recheckOf: setup.recheckOf, setup, startedAt: new Date(check.at),
  };
  if (check.running) return { ...common, state: "running" };
  const finishedAt = new Date(Date.parse(steps.at(-1)?.at ?? check.at) + LAST_LOOK);
  return { ...common, state: "finished", finishedAt, ...verdictColumns(verdictOf(check, setup, steps)) };
}

/**
 * Fill an empty log with the demo workshop's checks; to be run inside one write, after people, machines and catalogue.
 * The readings are data (runs.json, from a circuit simulator); the verdicts are the engine's, made here and now.
 */
export async function seedChecks(db: Pick<Database, "insert">): Promise<void> {
  for (const check of DEMO_CHECKS) {
    const steps = stepsOf(check);
    const row = rowOf(check, steps);
    await db.insert(checks).values(row);
    if (steps.length > 0) await db.insert(checkSteps).values(steps.map((step) => ({ id: step.id, checkId: row.id, at: new Date(step.at), receivedAt: new Date(step.at), step })));
  }
}
