import { eq } from "drizzle-orm";
import { describe, expect, it, vi } from "vitest";
import { readDb, write } from "@/db/client";
import { checks, checkSteps, confirmations } from "@/db/schema";
import { countConfirmed, experienceInForce } from "@/lib/checks/experience-rows";
import { isOfKind, outcomeId, outcomeOf } from "@/lib/checks/outcome-choices";
import { appendStepsSchema, setupSchema } from "@/lib/checks/schemas";
import { stepProblem } from "@/lib/checks/step-rules";
import { parseCheck, type Reading } from "@/lib/diagnosis";
import { eachTestOwnDatabase } from "@/tests/support/database";
import { drawer } from "@/tests/support/draw";
import { seedCatalogue } from "../catalogue";
import { seedMachines } from "../machines";
import { seedPeople } from "../people";
import { demoCheckId, seedChecks } from ".";
import { seedConfirmations } from "./confirmations";
import { demoCheck, demoMachine } from "./demo-machine";
import { readMeter } from "./read-meter";
import runs from "./runs.json";
import { trueValue } from "./simulate-readings";
import { DEMO_CHECKS } from "./specs";

const RUNS = runs as unknown as Readonly<Record<string, readonly Reading[]>>;

eachTestOwnDatabase();
// Every demo check is judged once, with its reasons.
vi.setConfig({ testTimeout: 180_000 });

async function seeded(): Promise<(typeof checks.$inferSelect)[]> {
  for (const part of [seedPeople, seedMachines, seedCatalogue, seedChecks]) await write(part);
  return readDb().select().from(checks).orderBy(checks.id);
}

describe("the demo checks", () => {
  it("are twenty and more finished ones on every machine, by several people, of all three kinds", async () => {
    const rows = await seeded();
    expect(rows[0]?.id).toBe("01M31GB7400000000000000001");
    const finished = rows.filter((row) => row.state === "finished");
    expect(finished.length).toBeGreaterThanOrEqual(20);
    expect(new Set(finished.flatMap((row) => row.machineId ?? [])).size).toBe(12);
    expect(new Set(finished.map((row) => row.personId)).size).toBeGreaterThanOrEqual(5);
    // One of them has a shorted signal, which leaves its kind open.
    expect(new Set(finished.flatMap((row) => row.kind ?? []))).toEqual(new Set(["potentiometer", "pwm", "voltage"]));
    expect(new Set(finished.map((row) => row.findingCode)).size).toBeGreaterThanOrEqual(8);
    expect(finished.filter((row) => row.recheckOf !== null)).toHaveLength(2);
    expect(finished.some((row) => row.verdict?.contradictory)).toBe(true);
    expect(finished.some((row) => (row.verdict?.openFindings.length ?? 0) > 1)).toBe(true);
  });

  it("would have passed the bounds of the server, step by step", async () => {
    for (const row of await seeded()) {
      const steps = (await readDb().select().from(checkSteps).where(eq(checkSteps.checkId, row.id))).map((s) => s.step);
      expect(setupSchema.safeParse(row.setup).error).toBeUndefined();
      expect(appendStepsSchema.safeParse({ steps }).error).toBeUndefined();
      expect(steps.map(stepProblem).filter((problem) => problem !== null)).toEqual([]);
    }
  });

  it("find what the simulated machine really had, where the technician went on to the end", async () => {
    const rows = new Map((await seeded()).map((row) => [row.id, row]));
    for (const check of DEMO_CHECKS.filter((c) => !c.stoppedAfter && !c.slipped)) {
      const open = rows.get(demoCheckId(check))?.verdict?.openFindings.map(({ code, pins }) => ({ code, ...(pins ? { pins } : {}) }));
      expect(open, `demo check ${check.number}`).toContainEqual(check.fault);
    }
  });

  // The readings were made by a general-purpose circuit simulator, outside the engine: its values, taken anew.
  it.each([1, 11, 13])("readings of check %i are what the circuit simulator and the meter give", async (number) => {
    const check = demoCheck(number);
    const { truth, meter } = demoMachine(check);
    const draw = drawer(number);
    const kept = RUNS[number] ?? [];
    expect(kept.length).toBeGreaterThan(2);
    for (const [code, value] of kept) {
      const spec = parseCheck(code);
      if (!spec) throw new Error(`no check ${code}`);
      expect(readMeter(spec, await trueValue(truth, spec, meter.spec), meter.spec, draw), code).toBe(value);
    }
  });

  it("that were proved are confirmed, one in force each, of finished first runs, as the form would have taken them", async () => {
    const rows = new Map((await seeded()).map((row) => [row.id, row]));
    await write(seedConfirmations);
    const made = await readDb().select().from(confirmations);
    for (const one of made) {
      expect(rows.get(one.checkId)).toMatchObject({ state: "finished", recheckOf: null });
      expect(outcomeOf(outcomeId({ code: one.findingCode, pins: one.findingPins ?? undefined }))).not.toBeNull();
      expect(isOfKind(one.findingCode, one.kind)).toBe(true);
      expect(one.countsKind).toBe(rows.get(one.checkId)?.setup.expect === undefined);
      expect(one.at.getTime()).toBeGreaterThan(rows.get(one.checkId)?.finishedAt?.getTime() ?? Infinity);
    }
    const inForce = made.filter((one) => one.withdrawnAt === null);
    expect(new Set(inForce.map((one) => one.checkId)).size).toBe(inForce.length);
    expect([inForce.length, made.length]).toEqual([9, 10]);
    expect(await experienceInForce(readDb())).toEqual(await countConfirmed(readDb()));
  });
});
