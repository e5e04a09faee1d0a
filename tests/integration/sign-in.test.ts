import { eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { readDb, transact, write } from "@/db/client";
import { auditRows, people, rateLimits } from "@/db/schema";
import { takePoints } from "@/lib/auth/rate-limits";
import { personOfSession } from "@/lib/auth/session-rows";
import { signIn, type BrowserFacts } from "@/lib/auth/sign-in";
import { signInLimits } from "@/lib/auth/sign-in-limits";
import { eachTestOwnDatabase } from "../support/database";
import { makePerson, TEST_PASSWORD } from "../support/people";

eachTestOwnDatabase();

const STRANGER: BrowserFacts = { address: "198.51.100.7", userAgent: "test", browserId: null, knownPeople: [], previousSessionId: null };
const known = (personId: string): BrowserFacts => ({ ...STRANGER, browserId: "browser-of-the-owner", knownPeople: [personId] });
const codeOf = (attempt: Promise<unknown>) => attempt.then(() => "signed-in", (error: { code?: string }) => error.code ?? String(error));

async function fail(email: string, times: number, facts = STRANGER): Promise<string[]> {
  const codes: string[] = [];
  for (let at = 0; at < times; at += 1) codes.push(await codeOf(signIn({ email, password: "wrong" }, facts)));
  return codes;
}

describe("signing in", () => {
  it("opens a session that names the person, and writes it down", async () => {
    const person = await makePerson(["editor", "trainer"]);
    const { sessionId } = await signIn({ email: ` ${person.email.toUpperCase()} `, password: TEST_PASSWORD }, STRANGER);
    expect(await personOfSession(sessionId)).toEqual(person);
    expect(await readDb().select({ verb: auditRows.verb, personId: auditRows.personId }).from(auditRows)).toEqual([{ verb: "session:open", personId: person.id }]);
  });

  it("ends the session this browser held before", async () => {
    const { email } = await makePerson();
    const first = await signIn({ email, password: TEST_PASSWORD }, STRANGER);
    await signIn({ email, password: TEST_PASSWORD }, { ...STRANGER, previousSessionId: first.sessionId });
    expect(await personOfSession(first.sessionId)).toBeNull();
  });

  it("answers an unknown address, a wrong password and a disabled account alike", async () => {
    const person = await makePerson();
    const disabled = await makePerson();
    await write((db) => db.update(people).set({ disabledAt: new Date() }).where(eq(people.id, disabled.id)));
    const answers = await Promise.all([
      signIn({ email: "nobody@canal-workshop.example", password: "wrong" }, STRANGER),
      signIn({ email: person.email, password: "wrong" }, STRANGER),
      signIn({ email: disabled.email, password: TEST_PASSWORD }, STRANGER),
    ].map((attempt) => attempt.catch((error: { code: string; message: string; status: number; field?: string }) => [error.code, error.message, error.status, error.field])));
    expect(answers[0]?.[0 as never]).toBe("wrong-credentials");
    expect(answers[1]).toEqual(answers[0]);
    expect(answers[2]).toEqual(answers[0]);
  });

  it("takes as long for an unknown address as for a known one", async () => {
    const { email } = await makePerson();
    const times = { known: [] as number[], unknown: [] as number[] };
    for (let at = 0; at < 7; at += 1) {
      for (const [who, address] of [["known", email], ["unknown", `nobody${at}@canal-workshop.example`]] as const) {
        const start = performance.now();
        await codeOf(signIn({ email: address, password: "wrong" }, STRANGER));
        times[who].push(performance.now() - start);
      }
    }
    const median = (list: number[]) => list.sort((a, b) => a - b)[3] ?? NaN;
    // One hash is about 200 ms; without the dummy hash an unknown address would answer in under 10 ms.
    expect(median(times.unknown) / median(times.known)).toBeGreaterThan(0.6);
    expect(median(times.unknown) / median(times.known)).toBeLessThan(1.6);
  });

  it("refuses a password over bcrypt's 72 bytes instead of cutting it", async () => {
    const { email } = await makePerson();
    expect(await codeOf(signIn({ email, password: "ü".repeat(37) }, STRANGER))).toBe("password-too-long");
    expect(await codeOf(signIn({ email, password: "ü".repeat(36) }, STRANGER))).toBe("wrong-credentials");
  });

  it.each([[null], [{}], [{ email: "x", password: "y" }], [{ email: ["a"], password: {} }], ["text"], [{ email: "a@b.example", password: "" }]])("refuses malformed input %j and counts nothing", async (input) => {
    expect(await codeOf(signIn(input, STRANGER))).toBe("invalid-input");
    expect(await readDb().$count(rateLimits)).toBe(0);
  });

  it("keeps the event loop free while four sign in at once", async () => {
    const { email } = await makePerson();
    await signIn({ email, password: TEST_PASSWORD }, STRANGER);
    let longest = 0;
    let last = performance.now();
    const timer = setInterval(() => {
      const now = performance.now();
      longest = Math.max(longest, now - last - 5);
      last = now;
    }, 5);
    await Promise.all([1, 2, 3, 4].map(() => signIn({ email, password: TEST_PASSWORD }, STRANGER)));
    clearInterval(timer);
    expect(longest).toBeLessThan(100);
  });
});

describe("the limit on signing in", () => {
  it("stops a sender after ten wrong passwords, the right one included", async () => {
    const { email } = await makePerson();
    expect(new Set(await fail(email, 10))).toEqual(new Set(["wrong-credentials"]));
    expect(await codeOf(signIn({ email, password: TEST_PASSWORD }, STRANGER))).toBe("too-many-attempts");
  });

  it("counts attempts made at the same moment", async () => {
    const { email } = await makePerson();
    const codes = await Promise.all(Array.from({ length: 25 }, () => codeOf(signIn({ email, password: "wrong" }, STRANGER))));
    expect(codes.filter((code) => code === "wrong-credentials")).toHaveLength(10);
  });

  it("limits an address nobody has just the same", async () => {
    expect((await fail("nobody@canal-workshop.example", 11)).at(-1)).toBe("too-many-attempts");
  });

  it("is not evaded by a new browser or another spelling of the address", async () => {
    const { email } = await makePerson();
    await fail(email, 10);
    expect(await codeOf(signIn({ email: email.toUpperCase(), password: "wrong" }, { ...STRANGER, browserId: "new", knownPeople: ["somebody else"] }))).toBe("too-many-attempts");
  });

  it("does not lock the owner out: a browser that signed in before still may, and another sender too", async () => {
    const owner = await makePerson();
    await fail(owner.email, 12);
    expect(await codeOf(signIn({ email: owner.email, password: TEST_PASSWORD }, known(owner.id)))).toBe("signed-in");
    expect(await codeOf(signIn({ email: owner.email, password: TEST_PASSWORD }, { ...STRANGER, address: "203.0.113.9" }))).toBe("signed-in");
  });

  it("limits a known browser by itself", async () => {
    const owner = await makePerson();
    expect((await fail(owner.email, 11, known(owner.id))).at(-1)).toBe("too-many-attempts");
  });

  it("stops many senders guessing at one account, but not its owner's browser", async () => {
    const owner = await makePerson();
    const now = new Date();
    for (let at = 0; at < 100; at += 1) {
      const limits = signInLimits({ email: owner.email, address: `192.0.2.${at}`, knownBrowserId: null });
      expect(await transact((tx) => takePoints(tx, limits, now))).toBeNull();
    }
    expect(await codeOf(signIn({ email: owner.email, password: TEST_PASSWORD }, { ...STRANGER, address: "192.0.2.200" }))).toBe("too-many-attempts");
    expect(await codeOf(signIn({ email: owner.email, password: TEST_PASSWORD }, known(owner.id)))).toBe("signed-in");
  });

  it("opens again after a quarter of an hour, and right passwords use nothing up", async () => {
    const { email } = await makePerson();
    const start = Date.now();
    for (let at = 0; at < 12; at += 1) await signIn({ email, password: TEST_PASSWORD }, STRANGER, new Date(start));
    for (let at = 0; at < 10; at += 1) await codeOf(signIn({ email, password: "wrong" }, STRANGER, new Date(start)));
    expect(await codeOf(signIn({ email, password: TEST_PASSWORD }, STRANGER, new Date(start + 14 * 60_000)))).toBe("too-many-attempts");
    expect(await codeOf(signIn({ email, password: TEST_PASSWORD }, STRANGER, new Date(start + 16 * 60_000)))).toBe("signed-in");
  });
});
