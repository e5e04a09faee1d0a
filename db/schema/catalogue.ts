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
  publishedBy: text("published_by").notNull().references(() => people.id),
  publishedAt: integer("published_at", { mode: "timestamp_ms" }).notNull(),
  /** Copied out of `data` for facets; they stand before it so that reading them skips its overflow pages. */
  name: text("name").notNull(),
  kind: text("kind").notNull(),
  maker: text("maker").notNull(),
  quantity: text("quantity").notNull(),
  connectorShape: text("connector_shape").notNull(),
  /** "5", "8" … volts, or "battery". */
  supply: text("supply").notNull(),
  /** IEC 60757 letters of the three wires in cavity order, joined by "/": "BN/BU/BK". */
  colours: text("colours").notNull(),
  /** Words the entry is found by; triggers copy it into the two FTS5 tables when the version is the one shown. */
  searchText: text("search_text").notNull(),
  data: text("data", { mode: "json" }).$type<EntryData>().notNull(),
}, (t) => [uniqueIndex("entry_versions_number").on(t.entryId, t.version), index("entry_versions_kind").on(t.kind)]);
