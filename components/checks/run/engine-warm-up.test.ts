import { describe, expect, it } from "vitest";
import { assess, type Reading, type Setup } from "@/lib/diagnosis";
import type { EngineClient } from "./engine-client";
import { warmUp } from "./engine-warm-up";

/** An engine that only notes what it was asked. */
function noting(apart: boolean) {
  const asked: { setup: Setup; readings: readonly Reading[] }[] = [];
  const engine: EngineClient = {
    apart: () => apart, close: () => undefined,
    ask: async (_job, setup, readings) => { asked.push({ setup, readings }); return null as never; },
  };
  return { engine, asked };
}

describe("running the engine in", () => {
  it("goes from no reading to five, one more at a time, all of them readings that a check could hold", async () => {
    const { engine, asked } = noting(true);
    await warmUp(engine, () => true);
    expect(asked.map(({ readings }) => readings.length)).toEqual([0, 1, 2, 3, 4, 5]);
    for (const { setup, readings } of asked) expect(["needs-reading", "ranked"]).toContain(assess(setup, readings).state);
  });

  it("stops as soon as a check begins", async () => {
    const { engine, asked } = noting(true);
    await warmUp(engine, () => asked.length < 2);
    expect(asked).toHaveLength(2);
  });

  it("does nothing where the engine would hold up the page", async () => {
    const { engine, asked } = noting(false);
    await warmUp(engine, () => true);
    expect(asked).toEqual([]);
  });
});
