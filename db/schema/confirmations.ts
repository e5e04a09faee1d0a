import { sql } from "drizzle-orm";
import { index, integer, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import type { Experience, FaultCode, Kind, PinNumber } from "../../lib/diagnosis";
import { checks } from "./checks";
import { people } from "./people";

/** What a finished check turned out to be. Never deleted: one that was wrong is withdrawn and stays on record. */
export const confirmations = sqliteTable("confirmations", {
  id: text("id").primaryKey(),
  checkId: text("check_id").notNull().references(() => checks.id),
  personId: text("person_id").notNull().references(() => people.id),
  at: integer("at", { mode: "timestamp_ms" }).notNull(),
  kind: text("kind").$type<Kind>().notNull(),
  findingCode: text("finding_code").$type<FaultCode>().notNull(),
  /** Pins at the finding's place, ascending; null where it has none. */
  findingPins: text("finding_pins", { mode: "json" }).$type<readonly PinNumber[]>(),
  /** How it was proved, in the person's own words. */
  proof: text("proof").notNull(),
  /** Does it count for the kinds? Not where an entry named the kind beforehand. */
  countsKind: integer("counts_kind", { mode: "boolean" }).notNull(),
  withdrawnAt: integer("withdrawn_at", { mode: "timestamp_ms" }),
  withdrawnBy: text("withdrawn_by").references(() => people.id),
}, (t) => [
  // One in force a check, whoever writes.
  uniqueIndex("confirmations_in_force").on(t.checkId).where(sql`withdrawn_at IS NULL`),
  index("confirmations_check").on(t.checkId, t.id),
]);

/**
 * Every state that the workshop's own counts have been in, oldest first; the last one is in force. A check that was
 * started without a server is judged by a state of its day, and the server can tell that there was such a state.
 */
export const experienceStates = sqliteTable("experience_states", {
  id: integer("id").primaryKey({ autoIncrement: true }),
  at: integer("at", { mode: "timestamp_ms" }).notNull(),
  personId: text("person_id").notNull().references(() => people.id),
  /** False while the workshop has set its own checks aside. */
  inUse: integer("in_use", { mode: "boolean" }).notNull(),
  /** Null where nothing is counted or the counts are set aside. */
  counts: text("counts", { mode: "json" }).$type<Experience>(),
}, (t) => [index("experience_states_at").on(t.at)]);
