import { effortFrom, stateAfter, type Compiled } from "./compile";
import { entropyBits, gainBits, surest, update } from "./gain";

/** Less information than this is rounding, not a test. */
export const NO_GAIN = 1e-9;

interface Level {
  readonly belief: Float64Array;
  readonly outcome: Float64Array;
  readonly gain: Float64Array;
  readonly effort: Float64Array;
  /** Tests in the order they are looked into, the first `count` of it valid. */
  readonly order: Int32Array;
}

/** Room for one search, made once: nothing is allocated inside. */
export class LookAhead {
  private readonly levels: Level[];
  private readonly used: Uint8Array;

  /**
   * @param price effort one bit is taken to cost beyond the horizon.
   * @param beam tests looked into at each step, the most promising first.
   */
  constructor(private readonly c: Compiled, depth: number, private readonly price: number, private readonly beam: number) {
    const tests = c.ids.length;
    this.used = new Uint8Array(tests);
    this.levels = Array.from({ length: depth + 1 }, () => ({
      belief: new Float64Array(c.size), outcome: new Float64Array(c.mostOutcomes), gain: new Float64Array(tests),
      effort: new Float64Array(tests), order: new Int32Array(tests),
    }));
  }

  /** Expected effort to the end if this test is made now and the best known ones after it. */
  after(test: number, belief: Float64Array, state: number, depth: number): number {
    const { c } = this;
    const level = this.levels[depth]!;
    gainBits(c, test, belief, level.outcome);
    const next = stateAfter(c, test, state);
    let effort = effortFrom(c, test, state);
    this.used[test] = 1;
    for (let o = 0; o < c.outcomes[test]!; o += 1) {
      const p = level.outcome[o]!;
      if (p <= 0) continue;
      update(c, test, o, p, belief, level.belief);
      effort += p * this.toGo(level.belief, next, depth - 1);
    }
    this.used[test] = 0;
    return effort;
  }

  private toGo(belief: Float64Array, state: number, depth: number): number {
    if (surest(belief) >= this.c.stopAt - 1e-12) return 0;
    const beyond = this.price * entropyBits(belief);
    if (depth === 0) return beyond;
    const count = this.promising(belief, state, depth);
    let best = Infinity;
    for (let i = 0; i < count; i += 1) best = Math.min(best, this.after(this.levels[depth]!.order[i]!, belief, state, depth));
    return count === 0 ? beyond : best;
  }

  /** Sorts the best tests by effort less priced information to the front of the level's order; returns how many. */
  private promising(belief: Float64Array, state: number, depth: number): number {
    const { c, price } = this;
    const { gain, effort, order, outcome } = this.levels[depth]!;
    let count = 0;
    for (let t = 0; t < c.ids.length; t += 1) {
      if (this.used[t]) continue;
      gain[t] = gainBits(c, t, belief, outcome);
      if (gain[t]! <= NO_GAIN) continue;
      effort[t] = effortFrom(c, t, state) - price * gain[t]!;
      let at = count < this.beam ? count : this.beam;
      if (at === this.beam && effort[order[at - 1]!]! <= effort[t]!) continue;
      if (at === this.beam) at -= 1;
      for (; at > 0 && effort[order[at - 1]!]! > effort[t]!; at -= 1) order[at] = order[at - 1]!;
      order[at] = t;
      count = Math.min(this.beam, count + 1);
    }
    return count;
  }
}
