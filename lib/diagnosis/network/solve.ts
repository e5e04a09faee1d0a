import { exp, ln } from "../numerics";

/**
 * Nodal analysis of small DC networks: resistors, real sources (a voltage behind a resistance) and diodes.
 * Method: modified for sources as Norton equivalents, so the matrix stays symmetric and positive; diodes by
 * Newton-Raphson with the junction-voltage limiting that circuit simulators use. Node 0 is the reference.
 */

/** Thermal voltage at 27 degrees C, volts: the default temperature of general-purpose circuit simulators. */
export const THERMAL_VOLTS = 0.025864;
/** Conductance to the reference at every node, siemens, as simulators add it, so that nothing floats. */
const MIN_SIEMENS = 1e-12;
const MAX_STEPS = 120;

interface Diode { anode: number; cathode: number; saturation: number; thermal: number; limitVolts: number; volts: number }

export class NodalNetwork {
  private readonly matrix: Float64Array;
  private readonly work: Float64Array;
  private readonly currents: Float64Array;
  private readonly diodes: Diode[] = [];
  private diodeCount = 0;
  /** Node voltages after `solve`, volts; index 0 is the reference, 0 V. */
  readonly volts: Float64Array;
  private size = 0;

  constructor(private readonly maxNodes: number) {
    this.matrix = new Float64Array(maxNodes * maxNodes);
    this.work = new Float64Array(maxNodes * maxNodes);
    this.currents = new Float64Array(maxNodes);
    this.volts = new Float64Array(maxNodes + 1);
  }

  /** Starts an empty network of `nodes` nodes beside the reference (1..nodes). Range: 1..maxNodes. */
  reset(nodes: number): void {
    if (nodes > this.maxNodes) throw new RangeError(`network holds at most ${this.maxNodes} nodes`);
    this.size = nodes;
    this.diodeCount = 0;
    this.matrix.fill(0, 0, nodes * nodes);
    this.currents.fill(0, 0, nodes);
    for (let i = 0; i < nodes; i++) this.matrix[i * nodes + i] = MIN_SIEMENS;
  }

  /** A resistor between two nodes, ohms (> 0); Infinity adds nothing. */
  resistor(a: number, b: number, ohms: number): void {
    const g = 1 / ohms;
    if (g === 0) return;
    this.conductance(this.matrix, a, b, g);
  }

  /** A voltage behind a resistance: `plus` stands `volts` above `minus` at no load. */
  source(plus: number, minus: number, volts: number, ohms: number): void {
    const g = 1 / ohms;
    if (g === 0) return;
    this.conductance(this.matrix, plus, minus, g);
    this.inject(this.currents, plus, minus, volts * g);
  }

  /**
   * A diode from anode to cathode; `saturation` is its saturation current in amperes, `emission` its emission coefficient (1 to 2 for
   * silicon), `guess` the junction voltage to start from, volts. The guess changes how soon, not where, the solution is found.
   */
  diode(anode: number, cathode: number, saturation: number, emission = 1, guess = 0): void {
    const thermal = emission * THERMAL_VOLTS, limitVolts = thermal * ln(thermal / (Math.SQRT2 * saturation));
    const slot = this.diodes[this.diodeCount];
    if (slot) { slot.anode = anode; slot.cathode = cathode; slot.saturation = saturation; slot.thermal = thermal; slot.limitVolts = limitVolts; slot.volts = guess; }
    else this.diodes.push({ anode, cathode, saturation, thermal, limitVolts, volts: guess });
    this.diodeCount++;
  }

  /** Solves for `volts`. Returns false when Newton's method did not settle (the last estimate is kept). */
  solve(): boolean {
    if (this.diodeCount === 0) { this.linear(this.work, this.currentsCopy()); return true; }
    for (let step = 0; step < MAX_STEPS; step++) if (this.newtonStep()) return true;
    return false;
  }

  private readonly rhs = new Float64Array(32);

  private currentsCopy(): Float64Array {
    const cells = this.size * this.size;
    for (let i = 0; i < cells; i++) this.work[i] = this.matrix[i]!;
    for (let i = 0; i < this.size; i++) this.rhs[i] = this.currents[i]!;
    return this.rhs;
  }

  /** Junction voltages, volts, in the order the diodes were added, written into `out`. */
  junctions(out: Float64Array): void {
    for (let k = 0; k < this.diodeCount; k++) out[k] = this.diodes[k]!.volts;
  }

  /**
   * One step of Newton's method from the junction voltages that the diodes were given as guesses: exact to the first order
   * where they solve a network that differs from this one by a little.
   */
  solveNear(): void {
    this.newtonStep();
  }

  private newtonStep(): boolean {
    const rhs = this.currentsCopy();
    for (let k = 0; k < this.diodeCount; k++) {
      const d = this.diodes[k]!;
      const e = exp(Math.min(d.volts / d.thermal, 80));
      const g = Math.max(d.saturation * e / d.thermal, MIN_SIEMENS);
      const i = d.saturation * (e - 1) + MIN_SIEMENS * d.volts;
      this.conductance(this.work, d.anode, d.cathode, g);
      this.inject(rhs, d.anode, d.cathode, g * d.volts - i);
    }
    this.linear(this.work, rhs);
    let settled = true;
    for (let k = 0; k < this.diodeCount; k++) {
      const d = this.diodes[k]!;
      const next = limitJunction(this.volts[d.anode]! - this.volts[d.cathode]!, d.volts, d);
      if (Math.abs(next - d.volts) > 1e-9) settled = false;
      d.volts = next;
    }
    return settled;
  }

  private conductance(m: Float64Array, a: number, b: number, g: number): void {
    const n = this.size;
    if (a > 0) m[(a - 1) * n + a - 1]! += g;
    if (b > 0) m[(b - 1) * n + b - 1]! += g;
    if (a > 0 && b > 0) { m[(a - 1) * n + b - 1]! -= g; m[(b - 1) * n + a - 1]! -= g; }
  }

  private inject(rhs: Float64Array, into: number, from: number, amperes: number): void {
    if (into > 0) rhs[into - 1]! += amperes;
    if (from > 0) rhs[from - 1]! -= amperes;
  }

  /** Gaussian elimination; the matrix is symmetric and diagonally dominant, so no pivoting is needed. */
  private linear(m: Float64Array, rhs: Float64Array): void {
    const n = this.size;
    for (let k = 0; k < n; k++) {
      const pivot = 1 / m[k * n + k]!;
      for (let i = k + 1; i < n; i++) {
        const factor = m[i * n + k]! * pivot;
        if (factor === 0) continue;
        for (let j = k + 1; j < n; j++) m[i * n + j]! -= factor * m[k * n + j]!;
        rhs[i]! -= factor * rhs[k]!;
      }
    }
    for (let i = n - 1; i >= 0; i--) {
      let sum = rhs[i]!;
      for (let j = i + 1; j < n; j++) sum -= m[i * n + j]! * this.volts[j + 1]!;
      this.volts[i + 1] = sum / m[i * n + i]!;
    }
  }
}

/** Keeps one Newton step of a junction within the reach of its exponential. */
function limitJunction(next: number, last: number, { thermal, limitVolts }: Diode): number {
  if (next <= limitVolts || Math.abs(next - last) <= 2 * thermal) return next;
  if (last <= 0) return thermal * ln(Math.max(next / thermal, Math.E));
  const grow = 1 + (next - last) / thermal;
  return grow > 0 ? last + thermal * ln(grow) : limitVolts;
}
