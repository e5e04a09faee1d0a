import { benchRow } from "../engine/bench-scores";
import type { BenchCase } from "../support/bench";
import { drawer } from "../support/draw";
import { readAnew } from "./drawn";
import { slope } from "./figures";
import { say, table } from "./table";

const CASES = 1000, PARTS = 10, SEED = 4_507, MB = 1024 * 1024, MANY = "1,000";
/** Growth over 1,000 cases below which memory counts as flat: 1 KB a check, which no phone ever adds up to a trouble. */
const FLAT_MB = 1;

interface Kept { readonly cases: number; readonly heap: number; readonly resident: number }

/** What is still in use once everything that nobody holds is gone, in MB. Needs node --expose-gc. */
function inUse(cases: number): Kept {
  if (!globalThis.gc) throw new Error("start node with --expose-gc");
  globalThis.gc();
  globalThis.gc();
  const { heapUsed, rss } = process.memoryUsage();
  return { cases, heap: heapUsed / MB, resident: rss / MB };
}

/** Section 3: memory in use over 1,000 checks followed to their end, every `every`-th of them. */
export function reportMemory(cases: readonly BenchCase[], every: number): void {
  const draw = drawer(SEED), part = Math.max(1, Math.round(CASES / PARTS / every)), kept: Kept[] = [];
  for (let i = 0; i < part * PARTS; i++) {
    benchRow(readAnew(cases[Math.floor(draw() * cases.length)]!, draw));
    if ((i + 1) % part === 0) kept.push(inUse(i + 1));
  }
  // The first part still fills what code needs once.
  const settled = kept.slice(1), growth = CASES * slope(settled.map(({ cases: x, heap: y }) => ({ x, y })));
  say(table(["cases", "heap in use MB", "resident MB"], kept.map((k) => [String(k.cases), k.heap.toFixed(2), k.resident.toFixed(0)])));
  say(`heap in use by the line through all but the first: ${growth >= 0 ? "+" : ""}${growth.toFixed(3)} MB in ${MANY} cases (${part * PARTS} were followed); lowest ${Math.min(...settled.map((k) => k.heap)).toFixed(2)}, highest ${Math.max(...settled.map((k) => k.heap)).toFixed(2)} MB`);
  say(`memory is ${Math.abs(growth) < FLAT_MB ? "flat" : "NOT flat"} (flat: less than ${FLAT_MB} MB in ${MANY} cases)`);
}
