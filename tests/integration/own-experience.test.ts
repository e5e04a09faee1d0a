import { and, eq, like } from "drizzle-orm";
import { ulid } from "ulid";
import { describe, expect, it } from "vitest";
import { readDb, write } from "@/db/client";
import { auditRows, confirmations, experienceStates } from "@/db/schema";
import type { Person } from "@/lib/auth/permissions";
import { abandonCheck } from "@/lib/checks/abandon-check";
import { appendSteps } from "@/lib/checks/append-steps";
import { confirmCheck } from "@/lib/checks/confirm-check";
import { countConfirmed, experienceInForce } from "@/lib/checks/experience-rows";
import { finishCheck } from "@/lib/checks/finish-check";
import { getCheck } from "@/lib/checks/get-check";
import { confirmationsOf, listConfirmations } from "@/lib/checks/list-confirmations";
import { experienceForPhone, showChances } from "@/lib/checks/show-chances";
import { startCheck } from "@/lib/checks/start-check";
import { startRecheck } from "@/lib/checks/start-recheck";
import { switchExperience } from "@/lib/checks/switch-experience";
import { withdrawConfirmation } from "@/lib/checks/withdraw-confirmation";
import { assess, type Experience, type Reading } from "@/lib/diagnosis";
import { eachTestOwnDatabase } from "../support/database";
import { makePerson } from "../support/people";
import { codeOf, makeRunning, OPEN_WIRE_READINGS, PLAIN_SETUP, readingStep } from "../support/workshop";

eachTestOwnDatabase();

const OPEN_WIRE = { finding: "wire-open:2", kind: "potentiometer", proof: "Wire 2 renewed, ladder angle is back." };
const COUNTED: Experience = { kinds: { potentiometer: 1 }, findings: { "wire-open": 1 } };
const SLIPPED: readonly Reading[] = [...OPEN_WIRE_READINGS.filter(([check]) => check !== "res:device:1-2@rest"), ["res:device:1-2@rest", 45_200], ["res:device:2-1@rest", 4521], ["res:device:3-1@rest", 5001]];

async function makeFinished(person: Person, readings: readonly Reading[] = OPEN_WIRE_READINGS): Promise<string> {
  const id = await makeRunning(person, readings);
  await finishCheck(person, id, {});
  return id;
}

const started = async (person: Person, experience?: Experience, now?: Date) => {
  const { id } = await startCheck(person, { id: ulid(), setup: { ...PLAIN_SETUP, ...(experience ? { experience } : {}) } }, now);
  return { id, experience: (await getCheck(person, id)).setup.experience };
};
const auditOf = async (subject: string) => (await readDb().select().from(auditRows).where(eq(auditRows.subjectId, subject)).orderBy(auditRows.id)).map((row) => row.verb);

describe("confirming a finished check", () => {
  it("is for the technician who made it, and for editors and trainers; it is counted, listed and audited", async () => {
    const [me, other, keeper, admin] = [await makePerson(), await makePerson(), await makePerson(["trainer"]), await makePerson(["administrator"])];
    const [mine, theirs] = [await makeFinished(me), await makeFinished(me)];
    expect(await codeOf(confirmCheck(other, mine, OPEN_WIRE))).toBe("not-allowed");
    expect(await codeOf(confirmCheck(admin, mine, OPEN_WIRE))).toBe("not-allowed");
    expect(await countConfirmed(readDb())).toBeUndefined();
    await confirmCheck(me, mine, OPEN_WIRE);
    await confirmCheck(keeper, theirs, { ...OPEN_WIRE, finding: "contact-open:2" });
    expect(await experienceInForce(readDb())).toEqual({ kinds: { potentiometer: 2 }, findings: { "wire-open": 1, "contact-open": 1 } });
    const { rows } = await listConfirmations(other, {});
    expect(rows.map((row) => [row.checkId, row.asVerdict, row.mayWithdraw])).toEqual([[theirs, false, false], [mine, true, false]]);
    expect((await auditOf(mine)).at(-1)).toBe("check:confirm");
  });

  it("wants a finding and a kind from the lists that go together, and a proof", async () => {
    const me = await makePerson();
    const id = await makeFinished(me);
    for (const wrong of [{ finding: "wire-open" }, { finding: "gremlins" }, { kind: "loop" }, { proof: " short " }, { proof: undefined }, { extra: 1 }]) {
      expect(await codeOf(confirmCheck(me, id, { ...OPEN_WIRE, ...wrong })), JSON.stringify(wrong)).toBe("invalid-input");
    }
    expect(await codeOf(confirmCheck(me, id, { ...OPEN_WIRE, finding: "wiper-open", kind: "pwm" }))).toBe("finding-not-of-kind");
    expect(await readDb().$count(confirmations)).toBe(0);
  });

  it("takes finished checks only, and no check that is not there or is somebody else's running one", async () => {
    const [me, other] = [await makePerson(), await makePerson(["editor"])];
    const running = await makeRunning(me, OPEN_WIRE_READINGS);
    expect(await codeOf(confirmCheck(me, running, OPEN_WIRE))).toBe("check-not-finished");
    expect(await codeOf(confirmCheck(other, running, OPEN_WIRE))).toBe("not-found");
    expect(await codeOf(confirmCheck(me, ulid(), OPEN_WIRE))).toBe("not-found");
    await abandonCheck(me, running);
    expect(await codeOf(confirmCheck(me, running, OPEN_WIRE))).toBe("check-not-finished");
  });

  it("takes one confirmation a check, in the database as well", async () => {
    const me = await makePerson(["editor"]);
    const id = await makeFinished(me);
    const both = await Promise.all([codeOf(confirmCheck(me, id, OPEN_WIRE)), codeOf(confirmCheck(me, id, OPEN_WIRE))]);
    expect(both.sort()).toEqual(["already-confirmed", "done"]);
    const twice = write((db) => db.insert(confirmations).values({ id: ulid(), checkId: id, personId: me.id, at: new Date(), kind: "pwm", findingCode: "none", proof: "x", countsKind: true }));
    await expect(twice).rejects.toThrow();
    expect(await countConfirmed(readDb())).toEqual(COUNTED);
  });

  it("takes a check whose readings contradict each other, and no re-check: that one proves a repair", async () => {
    const me = await makePerson();
    const id = await makeFinished(me, SLIPPED);
    expect((await getCheck(me, id)).verdict?.contradictory).toBe(true);
    await confirmCheck(me, id, OPEN_WIRE);
    expect((await confirmationsOf(me, id))[0]?.asVerdict).toBe(false);
    const again = await startRecheck(me, id, { id: ulid() });
    await appendSteps(me, again.id, { steps: [readingStep(["res:wire:2", 0.3])] });
    await finishCheck(me, again.id, {});
    expect(await codeOf(confirmCheck(me, again.id, { ...OPEN_WIRE, finding: "none" }))).toBe("confirm-first-run");
  });

  it("counts the kind only where no entry had named it", async () => {
    const me = await makePerson();
    const expected = { kind: "potentiometer", pins: { supply: 1, ground: 3, signal: 2 }, supplyVolts: 5 } as const;
    const id = await makeRunning(me, OPEN_WIRE_READINGS, { ...PLAIN_SETUP, expect: expected });
    await finishCheck(me, id, {});
    await confirmCheck(me, id, OPEN_WIRE);
    expect(await countConfirmed(readDb())).toEqual({ kinds: {}, findings: { "wire-open": 1 } });
  });
});

describe("withdrawing", () => {
  it("is for the person who confirmed and for those who may confirm all; the row stays, the count goes, and it can be confirmed anew", async () => {
    const [me, other, keeper] = [await makePerson(), await makePerson(), await makePerson(["editor"], "Edda")];
    const id = await makeFinished(me);
    const { id: confirmationId } = await confirmCheck(me, id, OPEN_WIRE);
    expect(await codeOf(withdrawConfirmation(other, { confirmationId }))).toBe("not-allowed");
    expect(await codeOf(withdrawConfirmation(me, { confirmationId: ulid() }))).toBe("not-found");
    await withdrawConfirmation(keeper, { confirmationId });
    expect(await codeOf(withdrawConfirmation(me, { confirmationId }))).toBe("already-withdrawn");
    expect(await experienceInForce(readDb())).toBeUndefined();
    expect((await listConfirmations(me, {})).rows).toEqual([]);
    expect(await confirmationsOf(me, id)).toMatchObject([{ withdrawn: { by: "Edda" }, proof: OPEN_WIRE.proof }]);
    await confirmCheck(me, id, { ...OPEN_WIRE, finding: "contact-open:2" });
    expect(await confirmationsOf(me, id)).toHaveLength(2);
    expect((await auditOf(id)).slice(-3)).toEqual(["check:confirm", "check:withdraw", "check:confirm"]);
  });
});

describe("the counts of a check", () => {
  it("are those in force at its start, the re-check's too, and never change after", async () => {
    const me = await makePerson();
    const first = await makeFinished(me);
    const before = await started(me);
    const { id: confirmationId } = await confirmCheck(me, first, OPEN_WIRE);
    const after = await started(me);
    const again = await startRecheck(me, first, { id: ulid() });
    await withdrawConfirmation(me, { confirmationId });
    expect([before.experience, after.experience]).toEqual([undefined, COUNTED]);
    expect((await getCheck(me, again.id)).setup.experience).toEqual(COUNTED);
    expect((await getCheck(me, after.id)).setup.experience).toEqual(COUNTED);
    expect((await started(me)).experience).toBeUndefined();
  });

  it("are the phone's where the workshop gave them out within a month, and the server's own otherwise", async () => {
    const me = await makePerson();
    const first = await makeFinished(me);
    const given = await experienceForPhone(me);
    const then = new Date("2026-03-01T08:00:00Z"), day = 86_400_000;
    const { id: confirmationId } = await confirmCheck(me, first, OPEN_WIRE, then);
    expect(await experienceForPhone(me)).toEqual(COUNTED);
    // Began without a server before the confirmation; then before the withdrawal; then too long ago; then never given out.
    expect((await started(me, given, new Date(then.getTime() + day))).experience).toBeUndefined();
    await withdrawConfirmation(me, { confirmationId }, new Date(then.getTime() + 2 * day));
    expect((await started(me, COUNTED, new Date(then.getTime() + 20 * day))).experience).toEqual(COUNTED);
    expect((await started(me, COUNTED, new Date(then.getTime() + 40 * day))).experience).toBeUndefined();
    const invented = await started(me, { kinds: {}, findings: { none: 900_000 } }, new Date(then.getTime() + 3 * day));
    expect(invented.experience).toBeUndefined();
    const [noted] = await readDb().select().from(auditRows).where(and(eq(auditRows.subjectId, invented.id), eq(auditRows.verb, "check:start")));
    expect(noted?.detail.experience).toMatch(/replaced/);
  });

  it("refuse what are no counts", async () => {
    const me = await makePerson();
    for (const experience of [{ kinds: { pwm: -1 }, findings: {} }, { kinds: {}, findings: { gremlins: 1 } }, { kinds: {}, findings: { none: 0.5 } }]) {
      expect(await codeOf(startCheck(me, { id: ulid(), setup: { ...PLAIN_SETUP, experience } }))).toBe("invalid-input");
    }
  });

  it("go into the verdict as they do on the phone; a phone that counted others is no defect of the engine", async () => {
    const me = await makePerson();
    await confirmCheck(me, await makeFinished(me), { ...OPEN_WIRE, finding: "contact-open:2" });
    const experience = await experienceForPhone(me);
    const standing = (own?: Experience) => JSON.parse(JSON.stringify(assess({ pins: PLAIN_SETUP.cavityLabels, ...(own ? { experience: own } : {}) }, OPEN_WIRE_READINGS))) as unknown;
    const run = async (claimed: Experience | undefined, body: unknown) => {
      const { id } = await started(me, claimed);
      await appendSteps(me, id, { steps: OPEN_WIRE_READINGS.map((reading) => readingStep(reading)) });
      await finishCheck(me, id, body);
      return (await auditOf(id)).filter((verb) => verb === "check:standing-differs").length;
    };
    expect(await run(experience, { standing: standing(experience), experience })).toBe(0);
    // A script of before this feature says nothing and judges by the published chances.
    expect(await run(undefined, { standing: standing() })).toBe(0);
    // Same counts, other belief: that is a defect, and is still found.
    expect(await run(experience, { standing: standing(), experience })).toBe(1);
  });
});

describe("setting own checks aside", () => {
  it("is for editors and administrators, leaves the confirmations alone, and can be undone", async () => {
    const [me, admin] = [await makePerson(["technician", "editor"]), await makePerson(["administrator"], "Ana")];
    await confirmCheck(me, await makeFinished(me), OPEN_WIRE);
    expect(await codeOf(switchExperience(await makePerson(["technician", "trainer"]), { inUse: false }))).toBe("not-allowed");
    await switchExperience(admin, { inUse: false });
    await switchExperience(admin, { inUse: false });
    expect((await started(me)).experience).toBeUndefined();
    await confirmCheck(me, await makeFinished(me), OPEN_WIRE);
    const aside = await showChances(me);
    expect(aside).toMatchObject({ ownChecks: 2, setAside: { by: "Ana" } });
    expect(aside.findings.every((row) => row.now === row.published)).toBe(true);
    await switchExperience(me, { inUse: true });
    expect((await started(me)).experience).toEqual({ kinds: { potentiometer: 2 }, findings: { "wire-open": 2 } });
    expect((await showChances(me)).setAside).toBeNull();
    const rows = await readDb().select({ verb: auditRows.verb }).from(auditRows).where(like(auditRows.verb, "experience:%")).orderBy(auditRows.id);
    expect(rows.map((row) => row.verb)).toEqual(["experience:set-aside", "experience:take-up"]);
  });

  it("keeps the noted state equal to a fresh count, whatever was done", async () => {
    const me = await makePerson(["editor"]);
    const made: string[] = [];
    for (let turn = 0; turn < 4; turn += 1) {
      made.push((await confirmCheck(me, await makeFinished(me), { ...OPEN_WIRE, finding: turn % 2 ? "none" : "wire-open:1" })).id);
      if (turn % 2) await withdrawConfirmation(me, { confirmationId: made[turn - 1] });
      expect(await experienceInForce(readDb())).toEqual(await countConfirmed(readDb()));
    }
    expect(await readDb().$count(experienceStates)).toBe(6);
  });
});
