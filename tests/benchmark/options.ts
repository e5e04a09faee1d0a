export const SECTIONS = ["steps", "orders", "memory", "browser"] as const;
export type Section = (typeof SECTIONS)[number];

export interface Options { readonly every: number; readonly only: ReadonlySet<Section> }

const isSection = (name: string): name is Section => (SECTIONS as readonly string[]).includes(name);

/**
 * What was asked for on the command line.
 * @throws an error that says what to write instead
 */
export function options(args: readonly string[]): Options {
  let every = 1, only: readonly Section[] = SECTIONS;
  for (let i = 0; i < args.length; i += 2) {
    const value = args[i + 1] ?? "";
    if (args[i] === "--every" && /^[1-9]\d{0,2}$/.test(value)) every = Number(value);
    else if (args[i] === "--only" && value.split(",").every(isSection)) only = value.split(",").filter(isSection);
    else throw new Error(`"${args[i]} ${value}": write --every N (1 to 999) or --only ${SECTIONS.join(",")}`);
  }
  return { every, only: new Set(only) };
}
