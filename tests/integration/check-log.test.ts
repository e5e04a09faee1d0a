import { and, desc, eq } from "drizzle-orm";
import { ulid } from "ulid";
import { describe, expect, it } from "vitest";
import { readDb, write } from "@/db/client";
import { checks } from "@/db/schema";
import { attachMachine } from "@/lib/checks/attach-machine";
import { confirmCheck } from "@/lib/checks/confirm-check";
import { finishCheck } from "@/lib/checks/finish-check";
import { getCheck } from "@/lib/checks/get-check";
import { listChecks } from "@/lib/checks/list-checks";
import { withdrawConfirmation } from "@/lib/checks/withdraw-confirmation";
import { listMachineChecks } from "@/lib/machines/list-machine-checks";
import { eachTestOwnDatabase } from "../support/database";
import { makePerson } from "../support/people";
import { codeOf, makeMachine, makeRunning, OPEN_WIRE_READINGS, PLAIN_SETUP } from "../support/workshop";

eachTestOwnDatabase();

describe("the log", () => {
  it("says what a check turned out to be, as the machine's history and the check itself do, until that is withdrawn", async () => {
    const me = await makePerson();
    const machineId = await makeMachine();
    const [confirmed, open] = [await makeRunning(me, OPEN_WIRE_READINGS), await makeRunning(me, OPEN_WIRE_READINGS)];
    for (const id of [confirmed, open]) { await finishCheck(me, id, {}); await attachMachine(me, id, { machineId }); }
    const { id: confirmationId } = await confirmCheck(me, confirmed, { finding: "contact-open:2", kind: "potentiometer", proof: "Contact renewed, the fault stays away." });
    const said = async () => [await listChecks(me, {}), { rows: (await listMachineChecks(me, { id: machineId })).newest }].map(({ rows }) => Object.fromEntries(rows.map((row) => [row.id, row.confirmed])));
    expect(await said()).toEqual([{ [confirmed]: "Contact 2 of the connector does not touch", [open]: null }, { [confirmed]: "Contact 2 of the connector does not touch", [open]: null }]);
    expect((await getCheck(me, confirmed)).confirmations).toMatchObject([{ id: confirmationId, finding: { code: "contact-open", pins: [2] }, asVerdict: false, withdrawn: null }]);
    expect((await getCheck(me, open)).confirmations).toEqual([]);
    await withdrawConfirmation(me, { confirmationId });
    expect(await said()).toEqual([{ [confirmed]: null, [open]: null }, { [confirmed]: null, [open]: null }]);
    expect((await getCheck(me, confirmed)).confirmations).toMatchObject([{ id: confirmationId, withdrawn: { by: expect.any(String) as string } }]);
  });

  it("filters by each of its fields and refuses what is no filter", async () => {
    const [me, other] = [await makePerson(), await makePerson()];
    const machineId = await makeMachine();
    const [mine, theirs] = [await makeRunning(me, OPEN_WIRE_READINGS), await makeRunning(other, OPEN_WIRE_READINGS.slice(0, 3))];
    await finishCheck(me, mine, {});
    await finishCheck(other, theirs, {});
    await attachMachine(me, mine, { machineId });
    await write((db) => db.update(checks).set({ startedAt: new Date("2026-03-05T23:30:00Z") }).where(eq(checks.id, mine)));
    const idsOf = async (filters: Record<string, string>) => (await listChecks(me, filters)).rows.map((row) => row.id);
    expect(await idsOf({ machine: machineId })).toEqual([mine]);
    expect(await idsOf({ person: other.id })).toEqual([theirs]);
    expect(await idsOf({ finding: "wire-open" })).toEqual([mine]);
    expect(await idsOf({ from: "2026-03-05", to: "2026-03-05" })).toEqual([mine]);
    expect(await idsOf({ to: "2026-03-04" })).toEqual([]);
    expect(await idsOf({ state: "running" })).toEqual([]);
    expect(await idsOf({ machine: "", kind: "", from: "" })).toHaveLength(2);
    for (const bad of [{ kind: "magnet" }, { from: "2026-02-30" }, { after: "1" }, { limit: "0" }]) expect(await codeOf(listChecks(me, bad))).toBe("invalid-input");
  });

  it("pages without gaps or repeats, ties in time included, in under 25 ms a query", async () => {
    const me = await makePerson();
    const at = Date.parse("2026-03-01T00:00:00Z");
    // Three checks a minute, so that times tie; a few thousand are years of a workshop's work.
    const rows = Array.from({ length: 3000 }, (_, i) => ({
      id: ulid(), personId: me.id, state: "finished" as const, setup: PLAIN_SETUP, startedAt: new Date(at + Math.floor(i / 3) * 60_000), kind: i % 2 ? "pwm" : "voltage", findingCode: i % 5 ? "none" : "wire-open", findingChance: 0.99,
    }));
    await write((db) => db.insert(checks).values(rows));
    const seen: string[] = [];
    const times: number[] = [];
    let after: string | null = "";
    while (after !== null) {
      const started = performance.now();
      const page: Awaited<ReturnType<typeof listChecks>> = await listChecks(me, { kind: "pwm", finding: "wire-open", limit: 50, after });
      times.push(performance.now() - started);
      seen.push(...page.rows.map((row) => row.id));
      after = page.next;
    }
    const expected = await readDb().select({ id: checks.id }).from(checks).where(and(eq(checks.kind, "pwm"), eq(checks.findingCode, "wire-open"))).orderBy(desc(checks.startedAt), desc(checks.id));
    expect(seen).toEqual(expected.map((row) => row.id));
    expect(times.sort((a, b) => a - b)[Math.floor(times.length / 2)]).toBeLessThan(25);
  });
});
