import { and, eq } from "drizzle-orm";
import { ulid } from "ulid";
import { describe, expect, it } from "vitest";
import { readDb } from "@/db/client";
import { auditRows, checks, checkSteps } from "@/db/schema";
import { abandonCheck } from "@/lib/checks/abandon-check";
import { appendSteps } from "@/lib/checks/append-steps";
import { attachMachine } from "@/lib/checks/attach-machine";
import { compareChecks } from "@/lib/checks/compare-checks";
import { finishCheck } from "@/lib/checks/finish-check";
import { getCheck } from "@/lib/checks/get-check";
import { listChecks } from "@/lib/checks/list-checks";
import { startCheck } from "@/lib/checks/start-check";
import { startRecheck } from "@/lib/checks/start-recheck";
import { assess } from "@/lib/diagnosis";
import { eachTestOwnDatabase } from "../support/database";
import { makePerson } from "../support/people";
import { AT, codeOf, makeMachine, makeRunning, OPEN_WIRE_READINGS, PLAIN_SETUP, readingStep } from "../support/workshop";

eachTestOwnDatabase();

const verbsOf = async (id: string) => (await readDb().select({ verb: auditRows.verb }).from(auditRows).where(eq(auditRows.subjectId, id)).orderBy(auditRows.id)).map((row) => row.verb);

describe("a check on the server", () => {
  it("starts once under the phone's id, and nobody else can take that id", async () => {
    const [me, other] = [await makePerson(), await makePerson()];
    const id = ulid();
    await startCheck(me, { id, setup: PLAIN_SETUP });
    await startCheck(me, { id, setup: { ...PLAIN_SETUP, note: "sent again" } });
    expect(await codeOf(startCheck(other, { id, setup: PLAIN_SETUP }))).toBe("id-in-use");
    expect((await getCheck(me, id)).setup).toEqual(PLAIN_SETUP);
    expect(await verbsOf(id)).toEqual(["check:start"]);
  });

  it("refuses entries, machines, meters and first runs that do not exist", async () => {
    const me = await makePerson();
    for (const part of [{ entryId: ulid(), entryVersionId: ulid() }, { entryId: ulid() }, { machineId: ulid() }, { meterId: ulid() }, { recheckOf: ulid() }]) {
      expect(await codeOf(startCheck(me, { id: ulid(), setup: { ...PLAIN_SETUP, ...part } }))).toBe("not-found");
    }
    expect(await readDb().$count(checks)).toBe(0);
  });

  it("believes the phone's time of start unless it lies ahead", async () => {
    const me = await makePerson();
    const [past, ahead] = [ulid(), ulid()];
    const now = new Date("2026-03-02T10:00:00Z");
    await startCheck(me, { id: past, setup: PLAIN_SETUP, startedAt: AT }, now);
    await startCheck(me, { id: ahead, setup: PLAIN_SETUP, startedAt: "2027-01-01T00:00:00Z" }, now);
    expect([(await getCheck(me, past)).startedAt, (await getCheck(me, ahead)).startedAt]).toEqual([AT, now.toISOString()]);
  });

  it("is not started by those whose roles do not allow it", async () => {
    expect(await codeOf(startCheck(await makePerson(["administrator"]), { id: ulid(), setup: PLAIN_SETUP }))).toBe("not-allowed");
  });
});

describe("steps", () => {
  it("are stored once however often they are sent, even after the check is finished", async () => {
    const me = await makePerson();
    const id = await makeRunning(me);
    const steps = OPEN_WIRE_READINGS.map((reading) => readingStep(reading));
    expect(await appendSteps(me, id, { steps: steps.slice(0, 3) })).toEqual({ added: 3 });
    expect(await appendSteps(me, id, { steps })).toEqual({ added: 2 });
    await finishCheck(me, id, {});
    expect(await appendSteps(me, id, { steps })).toEqual({ added: 0 });
    expect(await codeOf(appendSteps(me, id, { steps: [readingStep(["volt:battery", 24])] }))).toBe("check-closed");
    expect((await getCheck(me, id)).steps).toHaveLength(5);
  });

  it.each([
    ["a check outside the vocabulary", { ...readingStep(["volt:battery", 24]), check: "volt:moon" }, "unknown-check"],
    ["a word that the check does not take", readingStep(["volt:battery", "OL"]), "wrong-value"],
    ["more than 60 V", readingStep(["volt:battery", 80]), "out-of-bounds"],
    ["taking back a step that is not there", { id: ulid(), at: AT, type: "retract", step: ulid() }, "unknown-step"],
    ["an unknown type of step", { id: ulid(), at: AT, type: "verdict" }, "invalid-input"],
  ])("refuse %s, and keep nothing of that batch", async (_what, step, code) => {
    const me = await makePerson();
    const id = await makeRunning(me);
    expect(await codeOf(appendSteps(me, id, { steps: [readingStep(["res:wire:1", 0.2]), step] }))).toBe(code);
    expect(await readDb().$count(checkSteps)).toBe(0);
  });

  it("of another check are not taken over", async () => {
    const me = await makePerson();
    const step = readingStep(["res:wire:1", 0.2]);
    const [one, two] = [await makeRunning(me), await makeRunning(me)];
    await appendSteps(me, one, { steps: [step] });
    expect(await codeOf(appendSteps(me, two, { steps: [step] }))).toBe("step-in-use");
  });

  it("end at 400, and at 64 KB", async () => {
    const me = await makePerson();
    const many = await makeRunning(me);
    const batch = (count: number) => ({ steps: Array.from({ length: count }, () => readingStep(["res:wire:1", 0.2])) });
    await appendSteps(me, many, batch(390));
    expect(await codeOf(appendSteps(me, many, batch(11)))).toBe("too-many-steps");
    const long = await makeRunning(me);
    const notes = Array.from({ length: 200 }, () => ({ id: ulid(), at: AT, type: "skip", check: "res:wire:1", reason: "other", note: "x".repeat(290) }));
    expect(await codeOf(appendSteps(me, long, { steps: notes }))).toBe("check-too-large");
    expect((await getCheck(me, long)).steps).toEqual([]);
  });
});

describe("finishing", () => {
  it("judges on the server, says the same again, and leaves no trace of a difference where there is none", async () => {
    const me = await makePerson();
    const id = await makeRunning(me, OPEN_WIRE_READINGS);
    const standing = JSON.parse(JSON.stringify(assess({ pins: PLAIN_SETUP.cavityLabels }, OPEN_WIRE_READINGS))) as unknown;
    const first = await finishCheck(me, id, { standing });
    expect(first.verdict.faults[0]).toMatchObject({ code: "wire-open", pins: [2] });
    expect(first.verdict.evidence).toHaveLength(OPEN_WIRE_READINGS.length);
    expect(await finishCheck(me, id, {})).toEqual(first);
    expect(await verbsOf(id)).toEqual(["check:start", "check:append", "check:finish"]);
  });

  it("keeps its own answer and records the parts in which the phone's differs", async () => {
    const me = await makePerson();
    const id = await makeRunning(me, OPEN_WIRE_READINGS);
    const standing = JSON.parse(JSON.stringify(assess({ pins: PLAIN_SETUP.cavityLabels }, OPEN_WIRE_READINGS.slice(0, 3)))) as unknown;
    const { verdict } = await finishCheck(me, id, { standing });
    expect(verdict.faults[0]?.code).toBe("wire-open");
    const [row] = await readDb().select().from(auditRows).where(and(eq(auditRows.subjectId, id), eq(auditRows.verb, "check:standing-differs")));
    expect(row?.detail.parts).toContain("faults");
  });

  it("needs a reading, and a check that is one's own and running", async () => {
    const [me, other] = [await makePerson(), await makePerson()];
    const id = await makeRunning(me);
    expect(await codeOf(finishCheck(me, id, {}))).toBe("no-readings");
    expect(await codeOf(finishCheck(other, id, {}))).toBe("not-found");
    await abandonCheck(me, id);
    expect(await codeOf(finishCheck(me, id, {}))).toBe("check-closed");
  });
});

describe("who may see a check", () => {
  it("running ones only their own person, finished ones everybody in the workshop", async () => {
    const [me, other] = [await makePerson(), await makePerson(["administrator"])];
    const id = await makeRunning(me, OPEN_WIRE_READINGS);
    expect(await codeOf(getCheck(other, id))).toBe("not-found");
    expect((await listChecks(other, {})).rows).toEqual([]);
    await finishCheck(me, id, {});
    expect((await getCheck(other, id)).verdict?.sentence).toContain("wire of cavity 2");
    expect((await listChecks(other, {})).rows.map((row) => row.id)).toEqual([id]);
  });
});

describe("after the verdict", () => {
  it("a re-check is linked, has the same setup, and stands beside the first run", async () => {
    const [me, other] = [await makePerson(), await makePerson()];
    const setup = { ...PLAIN_SETUP, batteryVolts: 24, note: "first" };
    const first = await makeRunning(me, OPEN_WIRE_READINGS, setup);
    expect(await codeOf(startRecheck(me, first, { id: ulid() }))).toBe("check-running");
    await finishCheck(me, first, {});
    const { id } = await startRecheck(other, first, { id: ulid() });
    expect((await getCheck(other, id)).setup).toEqual({ ...PLAIN_SETUP, batteryVolts: 24, recheckOf: first });
    await appendSteps(other, id, { steps: [readingStep(["res:wire:2", 0.3])] });
    await finishCheck(other, id, {});
    for (const asked of [first, id]) {
      const comparison = await compareChecks(me, asked);
      expect([comparison.first.id, comparison.second?.id]).toEqual([first, id]);
      expect(comparison.rows.find((row) => row.check === "res:wire:2")).toMatchObject({ before: "OL", after: 0.3, change: "changed" });
    }
  });

  it("a machine is attached by the person of the check or by whoever keeps the machines, to a finished check only", async () => {
    const [me, other, keeper] = [await makePerson(), await makePerson(), await makePerson(["editor"])];
    const [machineId, second] = [await makeMachine("D-01"), await makeMachine("D-02")];
    const id = await makeRunning(me, OPEN_WIRE_READINGS);
    expect(await codeOf(attachMachine(me, id, { machineId }))).toBe("check-running");
    await finishCheck(me, id, {});
    expect(await codeOf(attachMachine(other, id, { machineId }))).toBe("not-allowed");
    expect(await codeOf(attachMachine(me, id, { machineId: ulid() }))).toBe("not-found");
    await attachMachine(me, id, { machineId });
    await attachMachine(keeper, id, { machineId: second });
    expect((await getCheck(me, id)).machine?.fleetNumber).toBe("D-02");
    expect((await verbsOf(id)).filter((verb) => verb === "check:attach")).toHaveLength(2);
  });
});
