import { ESLint } from "eslint";
import { describe, expect, it } from "vitest";

const eslint = new ESLint();

/** Rules broken by a piece of code, were it in this file. */
async function broken(filePath: string, code: string): Promise<(string | null)[]> {
  const [result] = await eslint.lintText(code, { filePath });
  return (result?.messages ?? []).map((message) => message.ruleId);
}

const PATHS = "import/no-restricted-paths";
const IMPORTS = "no-restricted-imports";

describe("the fences between folders bite", () => {
  it.each([
    ["app importing the database", "app/(workshop)/today/page.tsx", 'import { write } from "@/db/client";\nvoid write;\n', PATHS],
    ["app holding SQL", "app/(workshop)/today/page.tsx", 'import { sql } from "drizzle-orm";\nvoid sql;\n', IMPORTS],
    ["a component importing the database", "components/ui/sheet.tsx", 'import { readDb } from "../../db/client";\nvoid readDb;\n', PATHS],
    ["a component importing a route", "components/ui/sheet.tsx", 'import { setThemeAction } from "@/app/(workshop)/actions";\nvoid setThemeAction;\n', PATHS],
    ["lib importing a component", "lib/people/list-people.ts", 'import { Sheet } from "@/components/ui";\nvoid Sheet;\n', PATHS],
    ["db importing a component", "db/client.ts", 'import { Sheet } from "@/components/ui";\nvoid Sheet;\n', PATHS],
    ["the engine importing settings", "lib/diagnosis/priors.ts", 'import { env } from "@/lib/env";\nvoid env;\n', PATHS],
    ["the engine importing a neighbour by a relative path", "lib/diagnosis/priors.ts", 'import { AppError } from "../errors";\nvoid AppError;\n', PATHS],
    ["the engine reading files", "lib/diagnosis/priors.ts", 'import { readFileSync } from "node:fs";\nvoid readFileSync;\n', IMPORTS],
    ["going round the engine's door", "lib/checks/run.ts", 'import { DEFAULT_METER } from "@/lib/diagnosis/meter";\nvoid DEFAULT_METER;\n', IMPORTS],
    ["going round the engine's door from a component", "components/ui/sheet.tsx", 'import { DEFAULT_METER } from "@/lib/diagnosis/meter";\nvoid DEFAULT_METER;\n', IMPORTS],
    ["the engine reading the clock", "lib/diagnosis/priors.ts", "export const at = Date.now();\n", "no-restricted-globals"],
    ["the engine drawing lots", "lib/diagnosis/priors.ts", "export const at = Math.random();\n", "no-restricted-properties"],
    ["settings read outside lib/env.ts", "lib/people/list-people.ts", "export const url = process.env.DATABASE_URL;\n", "no-restricted-properties"],
    ["any", "lib/people/list-people.ts", "export const loose = (value: any) => value;\n", "@typescript-eslint/no-explicit-any"],
    ["silencing the compiler", "lib/people/list-people.ts", "// @ts-ignore\nexport const wrong: number = 'x';\n", "@typescript-eslint/ban-ts-comment"],
  ])("%s", async (_what, file, code, rule) => {
    expect(await broken(file, code)).toContain(rule);
  });

  it("a rule cannot be switched off from inside a file", async () => {
    const rules = await broken("app/page.tsx", '/* eslint-disable */\nimport { write } from "@/db/client";\nvoid write;\n');
    expect(rules).toContain(PATHS);
  });

  it("files over 200 lines and functions over 40 are refused", async () => {
    const lines = (count: number) => Array.from({ length: count }, (_, at) => `  console.error(${at});`).join("\n");
    expect(await broken("lib/parse.ts", Array.from({ length: 201 }, (_, at) => `export const a${at} = ${at};`).join("\n"))).toContain("max-lines");
    expect(await broken("lib/parse.ts", `export function long() {\n${lines(41)}\n}\n`)).toContain("max-lines-per-function");
  });

  it("what the arrows allow passes", async () => {
    expect(await broken("lib/people/list-people.ts", 'import { readDb } from "@/db/client";\nimport { KINDS } from "@/lib/diagnosis";\nvoid readDb;\nvoid KINDS;\n')).toEqual([]);
    expect(await broken("app/(workshop)/today/page.tsx", 'import { Sheet } from "@/components/ui";\nimport { listPeople } from "@/lib/people/list-people";\nvoid Sheet;\nvoid listPeople;\n')).toEqual([]);
  });
});
