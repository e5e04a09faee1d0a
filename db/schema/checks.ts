import { index, integer, real, sqliteTable, text } from "drizzle-orm/sqlite-core";
import type { RunSetup, RunStep } from "../../lib/checks/run";
import type { StoredVerdict } from "../../lib/checks/stored-verdict";
import { entries, entryVersions } from "./catalogue";
import { machines, meters } from "./machines";
import { people } from "./people";

export const checks = sqliteTable("checks", {
  id: text("id").primaryKey(),
  personId: text("person_id").notNull().references(() => people.id),
  entryId: text("entry_id").references(() => entries.id),
  entryVersionId: text("entry_version_id").references(() => entryVersions.id),
  machineId: text("machine_id").references(() => machines.id),
  meterId: text("meter_id").references(() => meters.id),
  /** The check this one repeats after a repair. */
  recheckOf: text("recheck_of"),
  state: text("state", { enum: ["running", "finished", "abandoned"] }).notNull(),
  setup: text("setup", { mode: "json" }).$type<RunSetup>().notNull(),
  startedAt: integer("started_at", { mode: "timestamp_ms" }).notNull(),
  finishedAt: integer("finished_at", { mode: "timestamp_ms" }),
  /** Computed on the server at finish; null while running. */
  verdict: text("verdict", { mode: "json" }).$type<StoredVerdict>(),
  /** Copied out of the verdict for the log's filters. */
  kind: text("kind"),
  findingCode: text("finding_code"),
  findingChance: real("finding_chance"),
  /** The verdict in a few words, for lists. */
  sentence: text("sentence"),
}, (t) => [
  // The log pages by (startedAt, id), newest first, whichever filter is on.
  index("checks_started").on(t.startedAt, t.id), index("checks_person").on(t.personId, t.startedAt),
  index("checks_machine").on(t.machineId, t.startedAt), index("checks_entry").on(t.entryId, t.startedAt),
  index("checks_kind").on(t.kind, t.startedAt), index("checks_finding").on(t.findingCode, t.startedAt),
  index("checks_recheck").on(t.recheckOf),
]);

export const checkSteps = sqliteTable("check_steps", {
  /** ULID made on the phone: sending a step twice does no harm. */
  id: text("id").primaryKey(),
  checkId: text("check_id").notNull().references(() => checks.id),
  at: integer("at", { mode: "timestamp_ms" }).notNull(),
  receivedAt: integer("received_at", { mode: "timestamp_ms" }).notNull(),
  step: text("step", { mode: "json" }).$type<RunStep>().notNull(),
}, (t) => [index("check_steps_check").on(t.checkId, t.id)]);
