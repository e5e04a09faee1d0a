import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

const root = fileURLToPath(new URL(".", import.meta.url));

export default defineConfig({
  resolve: {
    alias: {
      "@": root.replace(/\/$/, ""),
      // Next's marker package throws outside a React server build; tests run plain Node.
      "server-only": fileURLToPath(new URL("./tests/support/empty-module.ts", import.meta.url)),
    },
  },
  test: {
    include: ["tests/engine/**/*.test.ts", "tests/benchmark/**/*.test.ts", "lib/**/*.test.ts", "components/**/*.test.{ts,tsx}", "db/**/*.test.ts", "seed/**/*.test.ts", "tests/published-values/**/*.test.ts", "tests/integration/**/*.test.ts"],
    environment: "node",
    // Vitest leaves a core to itself; on two cores that would be half of them.
    maxWorkers: 2,
    testTimeout: 30_000,
    hookTimeout: 60_000,
  },
});
