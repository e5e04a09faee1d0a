import type { CheckSpec } from "../types";
import type { Outlook } from "./outlook";
import { exp } from "../numerics";

/** One believed candidate's share and what it expects; `row` is the hypothesis it counts towards. */
export interface Expected { readonly p: number; readonly row: number; readonly outlook: Outlook }

const MOST_EDGES = 8;
/** Share of readings that fall anywhere at all: slips of lead, eye and finger (common practice: a few in a thousand). */
const STRAY = 0.004;
/** The logistic curve that stays within 0.01 of the normal distribution. */
const normalBelow = (z: number) => 1 / (1 + exp(-1.702 * z));

/**
 * Chances of a check's outcomes, one row a hypothesis: the words it may show, then bands of numbers. The
 * bands are laid around what the likelier candidates expect, so that outcomes which differ fall apart.
 */
export function outcomeTable(spec: CheckSpec, index: number, expected: readonly Expected[], rows: number): number[][] {
  if (spec.unit === "word") return wordTable(spec, index, expected, rows);
  const edges = edgesFor(index, expected), columns = edges.length + 2;
  const table = emptyTable(rows, columns), weight = new Float64Array(rows);
  for (const { p, row, outlook } of expected) {
    const word = outlook.word[index]!, cells = table[row]!;
    weight[row]! += p;
    cells[0]! += p * word;
    if (word < 0.999) addBands(cells, p * (1 - word), outlook.mean[index]!, outlook.sd[index]!, edges);
  }
  return finish(table, weight);
}

function addBands(cells: number[], p: number, mean: number, sd: number, edges: readonly number[]): void {
  let below = 0;
  for (let k = 0; k < edges.length; k++) {
    const next = normalBelow((edges[k]! - mean) / sd);
    cells[k + 1]! += p * (next - below);
    below = next;
  }
  cells[edges.length + 1]! += p * (1 - below);
}

function wordTable(spec: CheckSpec, index: number, expected: readonly Expected[], rows: number): number[][] {
  const columns = spec.meter === "watch" ? 3 : 2, table = emptyTable(rows, columns), weight = new Float64Array(rows);
  for (const { p, row, outlook } of expected) {
    const word = outlook.word[index]!, jumps = columns === 3 ? outlook.jumps[index]! : 0, cells = table[row]!;
    weight[row]! += p;
    cells[0]! += p * word;
    cells[1]! += p * Math.max(0, 1 - word - jumps);
    if (columns === 3) cells[2]! += p * jumps;
  }
  return finish(table, weight);
}

/** Edges two and a half standard deviations either side of each expectation, the likelier candidates first. */
function edgesFor(index: number, expected: readonly Expected[]): number[] {
  const edges: number[] = [];
  for (const { outlook } of expected) {
    if (outlook.word[index]! > 0.9) continue;
    const mean = outlook.mean[index]!, sd = outlook.sd[index]!;
    for (const edge of [mean - 2.5 * sd, mean + 2.5 * sd]) {
      if (edges.length >= MOST_EDGES) return edges.sort((a, b) => a - b);
      if (edges.every((e) => Math.abs(e - edge) > sd)) edges.push(edge);
    }
  }
  return edges.sort((a, b) => a - b);
}

const emptyTable = (rows: number, columns: number) => Array.from({ length: rows }, () => new Array<number>(columns).fill(0));

function finish(table: number[][], weight: Float64Array): number[][] {
  return table.map((cells, row) => {
    const sum = cells.reduce((a, b) => a + b, 0);
    return cells.map((v) => (weight[row]! > 0 && sum > 0 ? (1 - STRAY) * v / sum : (1 - STRAY) / cells.length) + STRAY / cells.length);
  });
}
