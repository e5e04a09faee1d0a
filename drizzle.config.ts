import { defineConfig } from "drizzle-kit";

// dialect "turso": with "sqlite" drizzle-kit rebuilds tables and silently drops their triggers.
export default defineConfig({
  dialect: "turso",
  schema: "./db/schema/index.ts",
  out: "./drizzle",
  dbCredentials: { url: process.env.DATABASE_URL ?? "file:./data/pinwright.db" },
});
