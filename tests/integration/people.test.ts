import { desc } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { readDb, transact } from "@/db/client";
import { auditRows, people, sessions } from "@/db/schema";
import { hasPermission, type Person } from "@/lib/auth/permissions";
import { openSession, personOfSession } from "@/lib/auth/session-rows";
import { addFirstAdministrator } from "@/lib/people/add-first-administrator";
import { listAudit } from "@/lib/people/list-audit";
import { listOwnSessions } from "@/lib/people/list-own-sessions";
import { listPeople } from "@/lib/people/list-people";
import { revokeOwnSession } from "@/lib/people/revoke-own-session";
import { setDisabled } from "@/lib/people/set-disabled";
import { setRoles } from "@/lib/people/set-roles";
import { signOutElsewhere } from "@/lib/people/sign-out-elsewhere";
import { eachTestOwnDatabase } from "../support/database";
import { makePerson } from "../support/people";

eachTestOwnDatabase();

const open = (person: Person, now?: Date) => transact((tx) => openSession(tx, person.id, "test", now));
const codeOf = (attempt: Promise<unknown>) => attempt.then(() => "done", (error: { code?: string }) => error.code ?? String(error));

describe("sessions", () => {
  it("a revoked session is worth nothing from the next look-up on", async () => {
    const person = await makePerson();
    const [kept, lost] = [await open(person), await open(person)];
    await revokeOwnSession(person, { sessionId: lost });
    expect(await personOfSession(lost)).toBeNull();
    expect(await personOfSession(kept)).toEqual(person);
    expect((await listOwnSessions(person)).map((session) => session.id)).toEqual([kept]);
  });

  it("somebody else's session cannot be revoked, and nothing changes", async () => {
    const [mine, theirs] = [await makePerson(), await makePerson()];
    const sessionId = await open(theirs);
    expect(await codeOf(revokeOwnSession(mine, { sessionId }))).toBe("not-found");
    expect(await personOfSession(sessionId)).toEqual(theirs);
    expect(await readDb().$count(auditRows)).toBe(0);
  });

  it("signing out elsewhere leaves this browser and other people alone", async () => {
    const [person, other] = [await makePerson(), await makePerson()];
    const [here, there, foreign] = [await open(person), await open(person), await open(other)];
    expect(await signOutElsewhere(person, here)).toBe(1);
    expect(await personOfSession(here)).not.toBeNull();
    expect(await personOfSession(there)).toBeNull();
    expect(await personOfSession(foreign)).not.toBeNull();
  });

  it("ends after fourteen days", async () => {
    const person = await makePerson();
    const start = new Date("2026-11-01T00:00:00Z");
    const sessionId = await open(person, start);
    expect(await personOfSession(sessionId, new Date("2026-11-14T23:59:00Z"))).not.toBeNull();
    expect(await personOfSession(sessionId, new Date("2026-11-15T00:01:00Z"))).toBeNull();
  });
});

describe("roles", () => {
  it("a demotion bites in sessions already open", async () => {
    const [boss, editor] = [await makePerson(["administrator"]), await makePerson(["technician", "editor"])];
    const sessionId = await open(editor);
    expect(hasPermission(await personOfSession(sessionId), "entry:publish")).toBe(true);
    await setRoles(boss, { personId: editor.id, roles: ["technician"] });
    expect(hasPermission(await personOfSession(sessionId), "entry:publish")).toBe(false);
    const [row] = await readDb().select().from(auditRows).orderBy(desc(auditRows.id));
    expect(row).toMatchObject({ personId: boss.id, verb: "person:set-roles", subjectId: editor.id, detail: { from: ["technician", "editor"], to: ["technician"] } });
  });

  it("disabling ends every session, and opening the account does not bring them back", async () => {
    const [boss, person] = [await makePerson(["administrator"]), await makePerson()];
    const sessionId = await open(person);
    await setDisabled(boss, { personId: person.id, disabled: true });
    expect(await personOfSession(sessionId)).toBeNull();
    await setDisabled(boss, { personId: person.id, disabled: false });
    expect(await personOfSession(sessionId)).toBeNull();
  });

  it("the last administrator stays one and stays in; with a second one it may change", async () => {
    const boss = await makePerson(["administrator"]);
    await makePerson(["technician"]);
    expect(await codeOf(setRoles(boss, { personId: boss.id, roles: ["technician"] }))).toBe("last-administrator");
    expect(await codeOf(setDisabled(boss, { personId: boss.id, disabled: true }))).toBe("last-administrator");
    const second = await makePerson(["administrator"]);
    await setDisabled(boss, { personId: second.id, disabled: true });
    expect(await codeOf(setRoles(boss, { personId: boss.id, roles: ["technician"] }))).toBe("last-administrator");
    await setDisabled(boss, { personId: second.id, disabled: false });
    expect(await codeOf(setRoles(boss, { personId: boss.id, roles: ["technician"] }))).toBe("done");
  });

  it.each(["technician", "editor", "trainer"] as const)("a %s may not manage people", async (role) => {
    const [person, other] = [await makePerson([role]), await makePerson()];
    const before = await readDb().select().from(people);
    expect(await codeOf(setRoles(person, { personId: person.id, roles: ["administrator"] }))).toBe("not-allowed");
    expect(await codeOf(setDisabled(person, { personId: other.id, disabled: true }))).toBe("not-allowed");
    expect(await codeOf(listAudit(person))).toBe("not-allowed");
    expect(await codeOf(listPeople(person))).toBe(role === "trainer" ? "done" : "not-allowed");
    expect(await readDb().select().from(people)).toEqual(before);
  });

  it("malformed and foreign input changes nothing", async () => {
    const boss = await makePerson(["administrator"]);
    const before = [await readDb().select().from(people), await readDb().select().from(sessions), await readDb().select().from(auditRows)];
    for (const input of [null, 7, "x", [], {}, { personId: boss.id }, { personId: boss.id, roles: [] }, { personId: boss.id, roles: ["owner"] }, { personId: "1; drop table people", roles: ["editor"] }, { personId: boss.id, roles: ["editor"], disabled: true }]) {
      expect(await codeOf(setRoles(boss, input))).toBe("invalid-input");
      expect(await codeOf(setDisabled(boss, input))).toBe("invalid-input");
    }
    expect(await codeOf(setRoles(boss, { personId: "01K40000000000000000000099", roles: ["editor"] }))).toBe("not-found");
    expect([await readDb().select().from(people), await readDb().select().from(sessions), await readDb().select().from(auditRows)]).toEqual(before);
  });
});

describe("the audit list and the first administrator", () => {
  it("pages from the newest to the oldest without losing or repeating a line", async () => {
    const boss = await makePerson(["administrator"]);
    const other = await makePerson();
    for (let at = 0; at < 65; at += 1) await setDisabled(boss, { personId: other.id, disabled: at % 2 === 0 });
    const seen: string[] = [];
    for (let before: string | null | undefined; before !== null;) {
      const page = await listAudit(boss, before);
      seen.push(...page.lines.map((line) => line.id));
      before = page.next;
    }
    expect(seen).toHaveLength(65);
    expect(seen).toEqual([...new Set(seen)].sort().reverse());
  });

  it("is added to an empty workshop only", async () => {
    const settings = { email: "First@canal-workshop.example", password: "sluice-gate-and-oar" };
    expect(await addFirstAdministrator(settings)).toBe(true);
    expect(await addFirstAdministrator({ ...settings, email: "second@canal-workshop.example" })).toBe(false);
    expect(await readDb().select({ email: people.email, roles: people.roles }).from(people)).toEqual([{ email: "first@canal-workshop.example", roles: ["administrator"] }]);
  });
});
