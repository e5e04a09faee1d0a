import { readFileSync } from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";
import { MUTATIONS } from "./mutations";

const ROOT = fileURLToPath(new URL("../..", import.meta.url));

/** `npm run mutants` makes each of these mistakes in a copy of the engine and says which the tests catch. */
describe("the list of mistakes to catch", () => {
  it("has twenty or more, each with a name of its own", () => {
    expect(MUTATIONS.length).toBeGreaterThanOrEqual(20);
    expect(new Set(MUTATIONS.map(({ name }) => name)).size).toBe(MUTATIONS.length);
  });

  it.each(MUTATIONS.map((m) => [m.name, m] as const))("finds its place once: %s", (_, { file, search, replace }) => {
    expect(readFileSync(path.join(ROOT, file), "utf8").split(search)).toHaveLength(2);
    expect(replace).not.toBe(search);
  });
});
