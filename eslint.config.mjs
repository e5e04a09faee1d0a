import nextVitals from "eslint-config-next/core-web-vitals";
import nextTypescript from "eslint-config-next/typescript";

const CODE = ["**/*.{ts,tsx}"];
const TESTS = ["**/*.test.{ts,tsx}", "tests/**"];

// Arrows point one way: app -> components -> lib/<area> -> lib/diagnosis, and lib/<area> -> db.
const ZONES = [
  { target: "./app", from: "./db", message: "Pages, actions and routes call a verb of lib; only lib reads and writes the database." },
  { target: "./components", from: "./db", message: "Components are given their data." },
  { target: "./components", from: "./app", message: "Components know no routes." },
  { target: "./lib", from: "./app", message: "lib is below app." },
  { target: "./lib", from: "./components", message: "lib is below components." },
  { target: "./db", from: "./app", message: "db is below app." },
  { target: "./db", from: "./components", message: "db is below components." },
  { target: "./db", from: "./seed", message: "db is below the demo data." },
  { target: "./lib/units", from: ["./app", "./components", "./db", "./lib/auth", "./lib/catalogue", "./lib/checks", "./lib/people", "./lib/machines", "./lib/offline"], message: "Units are pure." },
  { target: "./lib/diagnosis", from: "./", except: ["./lib/diagnosis", "./node_modules"], message: "The engine imports nothing of the project." },
];

const DOOR = { group: ["@/lib/diagnosis/*", "**/lib/diagnosis/*"], message: "Import the engine only through its door, @/lib/diagnosis." };
const SQL = { group: ["drizzle-orm", "drizzle-orm/*", "@libsql/*", "@/db", "@/db/*"], message: "No SQL here: call one verb of lib." };
const ENGINE_OUTSIDE = { group: ["node:*", "next", "next/*", "react", "react-dom", "zod", "drizzle-orm", "drizzle-orm/*", "@libsql/*", "pino", "server-only"], message: "The engine is pure: no I/O, no clock, no framework." };

const restrict = (...patterns) => ({ "no-restricted-imports": ["error", { patterns }] });

const config = [
  { ignores: [".next/**", "node_modules/**", "data/**", "drizzle/**", "next-env.d.ts", "playwright-report/**", "test-results/**"] },
  ...nextVitals,
  ...nextTypescript,
  // Nobody argues with a rule from inside a file.
  { linterOptions: { noInlineConfig: true } },
  {
    files: CODE,
    rules: {
      "max-lines": ["error", { max: 200, skipBlankLines: true, skipComments: true }],
      "max-lines-per-function": ["error", { max: 40, skipBlankLines: true, skipComments: true }],
      "import/no-restricted-paths": ["error", { zones: ZONES }],
      "no-restricted-properties": ["error", { object: "process", property: "env", message: "Settings are read in lib/env.ts alone." }],
      "no-console": "error",
      eqeqeq: "error",
      ...restrict(DOOR),
    },
  },
  { files: ["app/**/*.{ts,tsx}", "components/**/*.{ts,tsx}"], rules: restrict(DOOR, SQL) },
  { files: ["lib/diagnosis/**/*.ts"], rules: restrict(ENGINE_OUTSIDE) },
  // The engine's command reads standard input; its tests need a test runner and references from outside.
  { files: ["lib/diagnosis/cli/**/*.ts", "lib/diagnosis/**/*.test.ts"], rules: { "no-restricted-imports": "off" } },
  {
    files: ["lib/diagnosis/**/*.ts"],
    ignores: ["lib/diagnosis/cli/**", "lib/diagnosis/**/*.test.ts"],
    rules: {
      "no-restricted-globals": ["error", { name: "Date", message: "The engine has no clock." }, { name: "performance", message: "The engine has no clock." }, { name: "process", message: "The engine is pure." }, { name: "fetch", message: "The engine is pure." }],
      "no-restricted-properties": [
        "error",
        { object: "Math", property: "random", message: "The engine has no randomness." },
        // Not exactly rounded: the last bit differs between browsers and server.
        ...["exp", "expm1", "log", "log1p", "log2", "log10", "pow", "hypot", "sin", "cos", "tan", "atan", "tanh", "cbrt"].map((property) => ({ object: "Math", property, message: "Use lib/diagnosis/numerics.ts: the same bits on phone and server." })),
      ],
      "no-restricted-syntax": ["error", { selector: "BinaryExpression[operator='**'], AssignmentExpression[operator='**=']", message: "Multiply, or use lib/diagnosis/numerics.ts: the same bits on phone and server." }],
    },
  },
  // NEXT_RUNTIME decides at build time which branch exists at all; the rest configures tools.
  { files: ["lib/env.ts", "instrumentation.ts", "*.config.{ts,mjs}", ...TESTS], rules: { "no-restricted-properties": "off" } },
  // A describe block is not a function to be read in one go, and tests may look behind the engine's door.
  { files: TESTS, rules: { "max-lines-per-function": "off", "no-restricted-imports": "off" } },
];

export default config;
