export type Cell = string | number;

/** Plain text, the first column to the left and the others to the right, so that figures stand under one another. */
export function table(head: readonly string[], rows: readonly (readonly Cell[])[]): string {
  const lines = [head, ...rows.map((row) => row.map(String))];
  const widths = head.map((_, column) => Math.max(...lines.map((line) => line[column]?.length ?? 0)));
  return lines.map((line) => line.map((cell, column) => (column === 0 ? cell.padEnd(widths[column] ?? 0) : cell.padStart(widths[column] ?? 0))).join("  ")).join("\n");
}

/** A figure beside what was asked for. A benchmark reports; it does not fail. */
export function against(what: string, value: number, unit: string, target: number, digits = 1): string {
  return `${what}: ${value.toFixed(digits)} ${unit} (asked for: at most ${target} ${unit}) ${value <= target ? "met" : "NOT met"}`;
}

export const say = (text = ""): void => { process.stdout.write(`${text}\n`); };
