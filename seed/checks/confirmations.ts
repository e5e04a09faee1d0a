import { inArray } from "drizzle-orm";
import type { Writer } from "@/db/client";
import { checks, confirmations } from "@/db/schema";
import { noteState } from "@/lib/checks/experience-rows";
import type { Fault } from "@/lib/diagnosis";
import { DEMO_PEOPLE } from "../people";
import { demoCheckId, fixedId } from ".";
import { demoCheck, demoMachine } from "./demo-machine";

interface DemoConfirmation {
  /** Number of the demo check. */
  readonly check: number;
  readonly person: "tilda" | "joram" | "edda" | "wim";
  /** UTC. */
  readonly at: string;
  readonly proof: string;
  /** What was recorded, where it is not what the machine truly had. */
  readonly slip?: Fault;
  /** UTC; withdrawn by the same person. */
  readonly withdrawnAt?: string;
}

/** In the order recorded. */
export const DEMO_CONFIRMATIONS: readonly DemoConfirmation[] = [
  { check: 1, person: "tilda", at: "2026-09-21T14:05:00Z", proof: "Wire to 2 was chafed through at the ladder hinge. New wire in a sleeve, 0.1 Ω end to end." },
  { check: 3, person: "joram", at: "2026-09-25T08:10:00Z", proof: "Green joint in the wire to 3, in the pit. Cut back and joined anew, 0.1 Ω; two wet days without the fault." },
  { check: 5, person: "edda", at: "2026-09-30T15:20:00Z", proof: "Hitch worked for two days with a recorder on the signal: smooth, no code." },
  { check: 6, person: "tilda", at: "2026-10-01T10:30:00Z", proof: "Sensor renewed, sweep is smooth. The old track shows a worn place at working height." },
  { check: 9, person: "tilda", at: "2026-10-07T15:00:00Z", proof: "Water in the housing of the sensor.", slip: { code: "wires-shorted", pins: [1, 2] }, withdrawnAt: "2026-10-08T07:20:00Z" },
  { check: 9, person: "tilda", at: "2026-10-08T07:25:00Z", proof: "Harness dry and sound. Sensor renewed, bridge closes on the latch." },
  { check: 12, person: "tilda", at: "2026-10-15T09:40:00Z", proof: "Input read 0 V parted, a sister tug reads 4.9 V. Controller exchanged, throttle follows." },
  { check: 14, person: "wim", at: "2026-10-20T11:15:00Z", proof: "Sensor renewed; the old one reads OL from the wiper to both ends." },
  { check: 15, person: "edda", at: "2026-10-21T12:00:00Z", proof: "Wires to 2 and 3 exchanged at the splice of last week. Put right, tilt follows the head." },
  { check: 23, person: "tilda", at: "2026-11-18T10:50:00Z", proof: "A point was keyed in one place off. All read again with Joram: sound, and the pedal works." },
];

function personId(name: DemoConfirmation["person"]): string {
  const person = DEMO_PEOPLE.find((one) => one.email.startsWith(`${name}@`));
  if (!person) throw new Error(`no ${name} in the demo workshop`);
  return person.id;
}

function rowOf(one: DemoConfirmation, number: number): typeof confirmations.$inferInsert {
  const check = demoCheck(one.check), at = new Date(one.at), by = personId(one.person);
  const finding: Fault = one.slip ?? check.fault;
  return {
    id: fixedId(at.getTime(), number), checkId: demoCheckId(check), personId: by, at,
    kind: demoMachine(check).truth.device.kind, findingCode: finding.code, findingPins: finding.pins ?? null, proof: one.proof, countsKind: !check.known,
    ...(one.withdrawnAt ? { withdrawnAt: new Date(one.withdrawnAt), withdrawnBy: by } : {}),
  };
}

/** What the demo workshop proved of its checks; to be run inside one write, after the checks. Without these nothing is confirmed. */
export async function seedConfirmations(tx: Writer): Promise<void> {
  const rows = DEMO_CONFIRMATIONS.map((one, index) => rowOf(one, index + 1));
  const known = new Set((await tx.select({ id: checks.id }).from(checks).where(inArray(checks.id, rows.map((row) => row.checkId)))).map((row) => row.id));
  for (const row of rows.filter((one) => known.has(one.checkId))) {
    await tx.insert(confirmations).values(row);
    await noteState(tx, row.personId, row.withdrawnAt ?? row.at);
  }
}
