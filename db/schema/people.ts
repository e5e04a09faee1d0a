import { index, integer, sqliteTable, text } from "drizzle-orm/sqlite-core";

/** Ids are ULIDs (sortable, can be made on a phone); times are UTC milliseconds. */
export const people = sqliteTable("people", {
  id: text("id").primaryKey(),
  email: text("email").notNull().unique(),
  name: text("name").notNull(),
  passwordHash: text("password_hash").notNull(),
  roles: text("roles", { mode: "json" }).$type<string[]>().notNull(),
  createdAt: integer("created_at", { mode: "timestamp_ms" }).notNull(),
  disabledAt: integer("disabled_at", { mode: "timestamp_ms" }),
});

/** One row a signed-in browser: the cookie alone is never enough, so that revoking bites at once. */
export const sessions = sqliteTable("sessions", {
  id: text("id").primaryKey(),
  personId: text("person_id").notNull().references(() => people.id),
  userAgent: text("user_agent").notNull(),
  createdAt: integer("created_at", { mode: "timestamp_ms" }).notNull(),
  lastSeenAt: integer("last_seen_at", { mode: "timestamp_ms" }).notNull(),
  expiresAt: integer("expires_at", { mode: "timestamp_ms" }).notNull(),
  revokedAt: integer("revoked_at", { mode: "timestamp_ms" }),
}, (t) => [index("sessions_person").on(t.personId)]);

export const rateLimits = sqliteTable("rate_limits", {
  key: text("key").primaryKey(),
  points: integer("points").notNull(),
  expiresAt: integer("expires_at", { mode: "timestamp_ms" }).notNull(),
}, (t) => [index("rate_limits_expiry").on(t.expiresAt)]);

export const auditRows = sqliteTable("audit_rows", {
  id: text("id").primaryKey(),
  at: integer("at", { mode: "timestamp_ms" }).notNull(),
  personId: text("person_id").references(() => people.id),
  /** Permission exercised, e.g. "check:finish". */
  verb: text("verb").notNull(),
  subjectType: text("subject_type").notNull(),
  subjectId: text("subject_id").notNull(),
  detail: text("detail", { mode: "json" }).$type<Record<string, unknown>>().notNull(),
}, (t) => [index("audit_subject").on(t.subjectType, t.subjectId), index("audit_at").on(t.at)]);
