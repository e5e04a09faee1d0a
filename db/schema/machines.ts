import { integer, real, sqliteTable, text } from "drizzle-orm/sqlite-core";
import type { MeterSpec } from "../../lib/diagnosis";

export const machines = sqliteTable("machines", {
  id: text("id").primaryKey(),
  fleetNumber: text("fleet_number").notNull().unique(),
  name: text("name").notNull(),
  /** dredger, weed-cutting boat, lock-paddle actuator, tractor, winch … */
  type: text("type").notNull(),
  site: text("site").notNull(),
  batteryVolts: real("battery_volts").notNull(),
  note: text("note").notNull().default(""),
  createdAt: integer("created_at", { mode: "timestamp_ms" }).notNull(),
  retiredAt: integer("retired_at", { mode: "timestamp_ms" }),
});

export const meters = sqliteTable("meters", {
  id: text("id").primaryKey(),
  name: text("name").notNull(),
  spec: text("spec", { mode: "json" }).$type<MeterSpec>().notNull(),
  createdAt: integer("created_at", { mode: "timestamp_ms" }).notNull(),
  retiredAt: integer("retired_at", { mode: "timestamp_ms" }),
});
