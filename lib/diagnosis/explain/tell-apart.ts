import { ALL_CHECKS, parseCheck } from "../checks";
import { faultId, type Candidate } from "../circuit/candidate";
import { everyCandidateForEntry, everyCandidateForUnknown } from "../inference/candidates";
import { stateAfter, TOGGLE_EFFORT } from "../inference/choose";
import { observe } from "../inference/observe";
import { outcomeTable, type Expected } from "../inference/outcomes";
import { outlookOf } from "../inference/outlook";
import { believe, type Believed } from "../inference/posterior";
import { DEFAULT_METER } from "../meter";
import { rankTests } from "../planning";
import { ROLES, type Fault, type MachineState, type Possibility, type Reading, type Setup, type TellingCheck } from "../types";
import { whyText } from "../words";
import { believedOf } from "./leaving-out";
import { predictionOf, type Piece } from "./prediction";

/** Least information, bits, for a check to be named as one that tells possibilities apart. */
const TELLS = 0.05;
/** From this chance on a possibility is taken as believed; below it, its candidates are fitted among themselves. */
const POSSIBLE = 1e-4;
/** Ways of building a possibility that are looked into, and the share of it that may be left out. */
const MOST_PIECES = 24, LEFT_OUT = 0.01;
const READING_EFFORT = 1;

const isFault = (p: Fault | Possibility): p is Fault => "code" in p;

/** Does a candidate agree with all that the possibility states? */
function agrees(possibility: Fault | Possibility): (c: Candidate) => boolean {
  const { kind, pins, fault } = isFault(possibility) ? { kind: undefined, pins: undefined, fault: possibility } : possibility;
  return ({ hypothesis: h }) => (!kind || h.kind === kind) && (!pins || ROLES.every((role) => pins[role] === h.pins[role])) && (!fault || faultId(fault) === faultId(h.fault));
}

/** The ways in which a possibility may be built, with shares that sum to 1 and what each expects; likeliest first. */
function piecesOf(setup: Setup, readings: readonly Reading[], all: readonly Believed[], possibility: Fault | Possibility): Piece[] {
  const meter = setup.meter ?? DEFAULT_METER, fits = agrees(possibility);
  let believed: readonly Believed[] = all.filter((b) => fits(b.candidate));
  if (believed.reduce((sum, b) => sum + b.p, 0) < POSSIBLE) {
    const byEntry = setup.expect ? everyCandidateForEntry(setup.expect, setup.experience).filter(fits) : [];
    const list = byEntry.length > 0 ? byEntry : everyCandidateForUnknown(setup.experience).filter(fits);
    believed = list.length === 0 ? [] : believe(list, observe(readings, meter), meter);
  }
  const whole = believed.reduce((sum, b) => sum + b.p, 0), pieces: Piece[] = [];
  let held = 0;
  for (const b of believed) {
    if (pieces.length >= MOST_PIECES || held > (1 - LEFT_OUT) * whole) break;
    pieces.push({ p: b.p / whole, outlook: outlookOf(b, meter) });
    held += b.p;
  }
  return pieces;
}

const switches = (s: MachineState): readonly (boolean | null)[] => [s.deviceParted, s.controllerParted, s.powerOn];

/**
 * Checks not yet taken that would tell the given possibilities apart, best first, with what each should read under every one of
 * them; the possibilities count as equally likely. Empty when nothing a meter can do will, or when the device cannot be one of them.
 * Method: expected information per effort, as for the next check (de Kleer & Williams 1987).
 */
export function tellApart(setup: Setup, readings: readonly Reading[], among: readonly (Fault | Possibility)[]): TellingCheck[] {
  const all = believedOf(setup, readings);
  const sides = among.map((possibility) => piecesOf(setup, readings, all, possibility)), rows = sides.length;
  if (rows < 2 || sides.some((pieces) => pieces.length === 0)) return [];
  const expected: Expected[] = sides.flatMap((pieces, row) => pieces.map(({ p, outlook }) => ({ p: p / rows, row, outlook }))).sort((a, b) => b.p - a.p);
  const closed = new Set([...readings.map(([check]) => check), ...(setup.excluded ?? [])]);
  const tests = ALL_CHECKS.flatMap((spec, index) => closed.has(spec.code) || spec.optional ? [] : [{
    id: spec.code, cost: READING_EFFORT, needs: switches(spec.state), outcomes: outcomeTable(spec, index, expected, rows),
  }]);
  const places = new Map(ALL_CHECKS.map(({ code }, index) => [code, index]));
  return rankTests({ priors: sides.map(() => 1 / rows), tests, state: stateAfter(setup, readings), toggleCosts: TOGGLE_EFFORT }, { lookAhead: 2, beam: 5 })
    .filter(({ gainBits }) => gainBits >= TELLS)
    .map(({ test, gainBits, effort }) => ({
      check: test, why: whyText(parseCheck(test)!, setup.pins), gainBits, effort, reads: sides.map((pieces) => predictionOf(pieces, places.get(test)!)),
    }));
}
