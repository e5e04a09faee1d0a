import { ALL_CHECKS, parseCheck } from "../checks";
import { rankTests, type PlannedTest } from "../planning";
import type { MachineState, MeterSpec, Reading, Setup } from "../types";
import { outcomeTable, type Expected } from "./outcomes";
import { outlookOf } from "./outlook";
import type { Believed } from "./posterior";

/** Effort of parting or mating the device connector, the controller connector, and of switching the power; a reading counts 1. */
export const TOGGLE_EFFORT = [2, 4, 1] as const;
const READING_EFFORT = 1;

/** Candidates and hypotheses looked into when a check is planned, and the belief that may be left out. */
const MOST_CANDIDATES = 48, MOST_HYPOTHESES = 32, LEFT_OUT = 0.004;
/** A build of a hypothesis counts when it holds this share of what the hypothesis' likeliest build does. */
const COUNTS_FROM = 0.1;

type Switches = readonly [boolean, boolean, boolean];

/** State of the machine after the readings: mated and switched off at first. Index: device parted, controller parted, power on. */
export function stateAfter(setup: Setup, readings: readonly Reading[]): Switches {
  if (setup.state) return [setup.state.deviceParted, setup.state.controllerParted, setup.state.powerOn];
  let state: Switches = [false, false, false];
  for (const [check] of readings) {
    const needs = switches(parseCheck(check)!.state);
    state = state.map((now, i) => needs[i] ?? now) as unknown as Switches;
  }
  return state;
}

const switches = (s: MachineState): readonly (boolean | null)[] => [s.deviceParted, s.controllerParted, s.powerOn];

/** The believed candidates as rows of hypotheses, likeliest first, with what each expects of every check. */
export function expectations(believed: readonly Believed[], meter: MeterSpec, wide = false): { expected: Expected[]; priors: number[]; ids: string[] } {
  const rows = new Map<string, { row: number; from: number }>(), priors: number[] = [], expected: Expected[] = [];
  let held = 0;
  for (const b of believed) {
    if (expected.length >= MOST_CANDIDATES || held > 1 - LEFT_OUT) break;
    held += b.p;
    const id = b.candidate.hypothesis.id, known = rows.get(id);
    if (!known && priors.length === MOST_HYPOTHESES) continue;
    const row = known?.row ?? priors.length;
    if (!known) rows.set(id, { row, from: COUNTS_FROM * b.p });
    priors[row] = (priors[row] ?? 0) + b.p;
    if (!known || b.p >= known.from) expected.push({ p: b.p, row, outlook: outlookOf(b, meter, wide) });
  }
  return { expected, priors, ids: [...rows.keys()] };
}

/** Checks not yet taken and not excluded, best first by what they are expected to tell for their effort. */
export function rankChecks(setup: Setup, readings: readonly Reading[], believed: readonly Believed[], meter: MeterSpec): PlannedTest[] {
  const { expected, priors } = expectations(believed, meter, setup.proposeOptional);
  if (priors.length < 2) return [];
  const closed = new Set([...readings.map(([check]) => check), ...(setup.excluded ?? [])]);
  const tests = ALL_CHECKS.flatMap((spec, index) => closed.has(spec.code) || (spec.optional && !setup.proposeOptional) ? [] : [{
    id: spec.code, cost: READING_EFFORT, needs: switches(spec.state), outcomes: outcomeTable(spec, index, expected, priors.length),
  }]);
  return rankTests({ priors, tests, state: stateAfter(setup, readings), toggleCosts: TOGGLE_EFFORT }, { lookAhead: 2, beam: 5 });
}
