import { index, integer, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import type { EntryData } from "../../lib/catalogue/entry-data";
import { people } from "./people";

export const entries = sqliteTable("entries", {
  id: text("id").primaryKey(),
  /** Readable address of the entry, ASCII kebab-case. */
  slug: text("slug").notNull().unique(),
  /** The version shown; null while the entry is only a draft. No foreign key: the two tables point at each other. */
  currentVersionId: text("current_version_id"),
  createdAt: integer("created_at", { mode: "timestamp_ms" }).notNull(),
  retiredAt: integer("retired_at", { mode: "timestamp_ms" }),
});

/** Immutable: every publish is a new row, and a check keeps the one it used. */
export const entryVersions = sqliteTable("entry_versions", {
  id: text("id").primaryKey(),
  entryId: text("entry_id").notNull().references(() => entries.id),
  version: integer("version").notNull(),
  data: text("data", { mode: "json" }).$type<EntryData>().notNull(),
  /** Copied out of `data` for facets. */
  name: text("name").notNull(),
  kind: text("kind").notNull(),
  maker: text("maker").notNull(),
  quantity: text("quantity").notNull(),
  connectorShape: text("connector_shape").notNull(),
  publishedBy: text("published_by").notNull().references(() => people.id),
  publishedAt: integer("published_at", { mode: "timestamp_ms" }).notNull(),
}, (t) => [uniqueIndex("entry_versions_number").on(t.entryId, t.version), index("entry_versions_kind").on(t.kind)]);
