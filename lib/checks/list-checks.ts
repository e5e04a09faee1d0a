import "server-only";
import { and, desc, eq, gte, lt, or, type SQL } from "drizzle-orm";
import { readDb } from "@/db/client";
import { checks, confirmations, entryVersions, machines, people } from "@/db/schema";
import { assertPermission, type Person } from "@/lib/auth/permissions";
import { parseInput } from "@/lib/parse";
import { visibleTo } from "./check-rows";
import type { CheckPage, CheckRow } from "./check-view";
import { CONFIRMED_COLUMNS, confirmedWords, inForce } from "./confirmed";
import { listChecksSchema, type ListChecksFilters } from "./schemas";

const PAGE = 20;
const DAY = 86_400_000;

const dayStart = (date: string): Date => new Date(`${date}T00:00:00.000Z`);

function conditions(person: Person, filters: ListChecksFilters): (SQL | undefined)[] {
  const { machine, entry, person: by, kind, finding, state, from, to } = filters;
  return [
    visibleTo(person),
    machine ? eq(checks.machineId, machine) : undefined, entry ? eq(checks.entryId, entry) : undefined,
    by ? eq(checks.personId, by) : undefined, kind ? eq(checks.kind, kind) : undefined,
    finding ? eq(checks.findingCode, finding) : undefined, state ? eq(checks.state, state) : undefined,
    from ? gte(checks.startedAt, dayStart(from)) : undefined,
    // The whole of the last day belongs to it.
    to ? lt(checks.startedAt, new Date(dayStart(to).getTime() + DAY)) : undefined,
  ];
}

/** Everything after the last row seen, in the log's order: newest first, ties by id. */
function beyond(after: string | undefined): SQL | undefined {
  if (!after) return undefined;
  const dot = after.indexOf(".");
  const at = new Date(Number(after.slice(0, dot)));
  return or(lt(checks.startedAt, at), and(eq(checks.startedAt, at), lt(checks.id, after.slice(dot + 1))));
}

const COLUMNS = {
  id: checks.id, state: checks.state, startedAt: checks.startedAt, finishedAt: checks.finishedAt, sentence: checks.sentence,
  kind: checks.kind, findingCode: checks.findingCode, findingChance: checks.findingChance, recheckOf: checks.recheckOf,
  personId: checks.personId, personName: people.name, machineId: machines.id, fleetNumber: machines.fleetNumber, machineName: machines.name, entryName: entryVersions.name, ...CONFIRMED_COLUMNS,
} as const;

function select(person: Person, filters: ListChecksFilters, limit: number) {
  return readDb().select(COLUMNS).from(checks)
    .innerJoin(people, eq(people.id, checks.personId)).leftJoin(machines, eq(machines.id, checks.machineId))
    .leftJoin(entryVersions, eq(entryVersions.id, checks.entryVersionId)).leftJoin(confirmations, inForce)
    .where(and(...conditions(person, filters), beyond(filters.after)))
    .orderBy(desc(checks.startedAt), desc(checks.id)).limit(limit + 1);
}

type Selected = Awaited<ReturnType<typeof select>>[number];

function toRow({ personId, personName, machineId, fleetNumber, machineName, setup, confirmedCode, confirmedPins, ...row }: Selected): CheckRow {
  return {
    ...row, startedAt: row.startedAt.toISOString(), finishedAt: row.finishedAt?.toISOString() ?? null,
    person: { id: personId, name: personName }, confirmed: confirmedWords({ setup, confirmedCode, confirmedPins }),
    machine: machineId && fleetNumber ? { id: machineId, fleetNumber, name: machineName ?? "" } : null,
  };
}

/**
 * The log of checks, newest first, a page at a time: everybody's finished ones and one's own running and abandoned ones.
 * @param input filters as in the address; see `listChecksSchema`
 * @throws AppError not-allowed (403), invalid-input (400)
 */
export async function listChecks(person: Person, input: unknown): Promise<CheckPage> {
  assertPermission(person, "check:read");
  const filters = parseInput(listChecksSchema, input);
  const limit = filters.limit ?? PAGE;
  const found = await select(person, filters, limit);
  const shown = found.slice(0, limit);
  const last = shown.at(-1);
  return { rows: shown.map(toRow), next: found.length > limit && last ? `${last.startedAt.getTime()}.${last.id}` : null };
}
