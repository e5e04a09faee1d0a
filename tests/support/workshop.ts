import { ulid } from "ulid";
import { write } from "@/db/client";
import { machines } from "@/db/schema";
import { appendSteps } from "@/lib/checks/append-steps";
import type { RunSetup, RunStep } from "@/lib/checks/run";
import { startCheck } from "@/lib/checks/start-check";
import type { Person } from "@/lib/auth/permissions";
import type { Reading } from "@/lib/diagnosis";

/** A machine in the database. */
export async function makeMachine(fleetNumber = "D-01"): Promise<string> {
  const id = ulid();
  await write((db) => db.insert(machines).values({ id, fleetNumber, name: "Patience", type: "dredger", site: "Marlpit Basin", batteryVolts: 24, createdAt: new Date() }));
  return id;
}

export const AT = "2026-03-01T08:00:00.000Z";
export const PLAIN_SETUP: RunSetup = { cavityLabels: ["1", "2", "3"] };

/** A reading as a step of a run. */
export function readingStep([check, value]: Reading, id = ulid()): RunStep {
  return { id, at: AT, type: "reading", check, value, typed: String(value) };
}

/** A running check of this person's with these readings. */
export async function makeRunning(person: Person, readings: readonly Reading[] = [], setup: RunSetup = PLAIN_SETUP): Promise<string> {
  const { id } = await startCheck(person, { id: ulid(), setup });
  if (readings.length > 0) await appendSteps(person, id, { steps: readings.map((reading) => readingStep(reading)) });
  return id;
}

/** A potentiometer of 5 kΩ, its wire 2 open. [computed from the divider; common practice for the harness] */
export const OPEN_WIRE_READINGS: readonly Reading[] = [["res:device:1-3@rest", 5000], ["res:device:1-2@rest", 4520], ["res:device:2-3@rest", 540], ["res:wire:2", "OL"], ["res:wire:1", 0.3]];

/** "done", or the code of the error that an attempt ended with. */
export const codeOf = (attempt: Promise<unknown>): Promise<string> => attempt.then(() => "done", (error: { code?: string }) => error.code ?? String(error));
