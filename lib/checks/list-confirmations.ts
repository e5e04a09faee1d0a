import "server-only";
import { and, desc, eq, isNull, lt, type SQL } from "drizzle-orm";
import { alias } from "drizzle-orm/sqlite-core";
import { readDb } from "@/db/client";
import { checks, confirmations, machines, people } from "@/db/schema";
import { assertPermission, hasPermission, type Person } from "@/lib/auth/permissions";
import { parseInput } from "@/lib/parse";
import type { ConfirmationPage, ConfirmationView } from "./confirmation-view";
import { listConfirmationsSchema } from "./confirm-schemas";
import { outcomeId } from "./outcome-choices";

const PAGE = 20;
const withdrawers = alias(people, "withdrawers");

const COLUMNS = { confirmation: confirmations, by: people.name, withdrawnByName: withdrawers.name, setup: checks.setup, verdict: checks.verdict, fleetNumber: machines.fleetNumber, machineName: machines.name } as const;

function select(where: SQL | undefined, limit: number) {
  return readDb().select(COLUMNS).from(confirmations)
    .innerJoin(checks, eq(checks.id, confirmations.checkId)).innerJoin(people, eq(people.id, confirmations.personId))
    .leftJoin(withdrawers, eq(withdrawers.id, confirmations.withdrawnBy)).leftJoin(machines, eq(machines.id, checks.machineId))
    .where(where).orderBy(desc(confirmations.id)).limit(limit);
}

type Selected = Awaited<ReturnType<typeof select>>[number];

function toView(person: Person, { confirmation: row, verdict, ...names }: Selected): ConfirmationView {
  const finding = { code: row.findingCode, ...(row.findingPins ? { pins: row.findingPins } : {}) };
  const first = verdict && !verdict.contradictory ? verdict.faults[0] : undefined;
  return {
    id: row.id, checkId: row.checkId, finding, kind: row.kind, proof: row.proof, at: row.at.toISOString(), by: names.by,
    withdrawn: row.withdrawnAt ? { at: row.withdrawnAt.toISOString(), by: names.withdrawnByName ?? "" } : null,
    mayWithdraw: !row.withdrawnAt && hasPermission(person, "check:confirm") && (row.personId === person.id || hasPermission(person, "check:confirm-any")),
    labels: names.setup.cavityLabels, machine: names.fleetNumber ? `${names.fleetNumber} ${names.machineName ?? ""}` : null,
    verdict: verdict?.short ?? "", asVerdict: first !== undefined && outcomeId(first) === outcomeId(finding),
  };
}

/**
 * Confirmations in force, newest first, a page at a time: what has shifted the chances.
 * @throws AppError not-allowed (403), invalid-input (400)
 */
export async function listConfirmations(person: Person, input: unknown): Promise<ConfirmationPage> {
  assertPermission(person, "check:read");
  const { before } = parseInput(listConfirmationsSchema, input);
  const found = await select(and(isNull(confirmations.withdrawnAt), before ? lt(confirmations.id, before) : undefined), PAGE + 1);
  const shown = found.slice(0, PAGE);
  return { rows: shown.map((row) => toView(person, row)), next: found.length > PAGE ? shown.at(-1)?.confirmation.id ?? null : null };
}

/** More than this on one check, and the oldest withdrawn ones are not shown. */
const MOST_OF_A_CHECK = 20;

/**
 * What was recorded of one check, newest first, withdrawn ones too. The caller has authorised the check itself:
 * only finished ones have any, and those are open to the whole workshop.
 * @throws AppError not-allowed (403)
 */
export async function confirmationsOf(person: Person, checkId: string): Promise<readonly ConfirmationView[]> {
  assertPermission(person, "check:read");
  return (await select(eq(confirmations.checkId, checkId), MOST_OF_A_CHECK)).map((row) => toView(person, row));
}
