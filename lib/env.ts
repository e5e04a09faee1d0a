import "server-only";
import { randomBytes } from "node:crypto";
import { mkdirSync, readFileSync, writeFileSync } from "node:fs";
import path from "node:path";
import { z } from "zod";

/**
 * The only reader of process.env.
 *
 * Which rules hold is decided by PINWRIGHT_ENV: "local" (development, demo, tests) or "production".
 * When it is not set, a production build of the server counts as production, so that forgetting the
 * variable errs on the strict side. `npm run up` sets "local".
 */
const schema = z.object({
  NODE_ENV: z.string().default("development"),
  PINWRIGHT_ENV: z.enum(["local", "production"]).optional(),
  DATABASE_URL: z.string().regex(/^(file:|libsql:|https?:|wss?:)/, "DATABASE_URL must start with file: or libsql://").default("file:./data/pinwright.db"),
  DATABASE_AUTH_TOKEN: z.string().optional(),
  SESSION_SECRET: z.string().min(32, "SESSION_SECRET must have at least 32 characters").optional(),
  APP_ORIGIN: z.url("APP_ORIGIN must be an address such as https://checks.example").transform((url) => new URL(url).origin).optional(),
  TRUSTED_PROXY_HOPS: z.coerce.number("TRUSTED_PROXY_HOPS must be a whole number").int().min(0).max(5).default(0),
  LOG_LEVEL: z.enum(["trace", "debug", "info", "warn", "error", "fatal", "silent"]).default("info"),
  FIRST_ADMIN_EMAIL: z.email("FIRST_ADMIN_EMAIL must be an e-mail address").optional(),
  FIRST_ADMIN_PASSWORD: z.string().min(12, "FIRST_ADMIN_PASSWORD must have at least 12 characters").optional(),
});

export interface Env {
  readonly production: boolean;
  /** The development server, whose refreshing needs a looser content security policy. */
  readonly development: boolean;
  readonly databaseUrl: string;
  readonly databaseAuthToken: string | undefined;
  /** Seals the cookies; at least 32 characters. */
  readonly sessionSecret: string;
  /** The address people use, e.g. "https://checks.example"; undefined: taken from the request. */
  readonly appOrigin: string | undefined;
  /** How many proxies of our own stand in front; 0: X-Forwarded-* is not believed. */
  readonly trustedProxyHops: number;
  readonly logLevel: string;
  readonly firstAdministrator: { readonly email: string; readonly password: string } | undefined;
}

const SECRETS_FILE = path.join(/* turbopackIgnore: true */ process.cwd(), "data", "secrets.json");

/** Local runs need no set-up: a secret is made once and kept in the git-ignored data folder. */
function localSecret(): string {
  const kept = readLocalSecret();
  if (kept) return kept;
  mkdirSync(path.dirname(SECRETS_FILE), { recursive: true });
  const made = randomBytes(32).toString("base64url");
  try {
    // "wx": of two processes starting at once, one writes and the other reads.
    writeFileSync(SECRETS_FILE, `${JSON.stringify({ sessionSecret: made }, null, 2)}\n`, { mode: 0o600, flag: "wx" });
    return made;
  } catch (error) {
    const other = readLocalSecret();
    if (other) return other;
    throw error;
  }
}

function readLocalSecret(): string | null {
  try {
    const kept = z.object({ sessionSecret: z.string().min(32) }).safeParse(JSON.parse(readFileSync(SECRETS_FILE, "utf8")));
    return kept.success ? kept.data.sessionSecret : null;
  } catch {
    return null;
  }
}

/**
 * Parse the settings.
 * @throws Error naming the variable, when one is malformed or production lacks its own secret.
 */
export function parseEnv(source: Readonly<Record<string, string | undefined>>): Env {
  // An empty variable is an unset one, as in most shells' habits.
  const given = Object.fromEntries(Object.entries(source).filter(([, value]) => value !== ""));
  const parsed = schema.safeParse(given);
  if (!parsed.success) throw new Error(`Settings: ${parsed.error.issues.map((issue) => `${issue.path.join(".")}: ${issue.message}`).join("; ")}.`);
  const value = parsed.data;
  const production = (value.PINWRIGHT_ENV ?? (value.NODE_ENV === "production" ? "production" : "local")) === "production";
  if (production && !value.SESSION_SECRET) {
    throw new Error("Settings: SESSION_SECRET is not set. Production needs its own secret of at least 32 random characters; for a demo set PINWRIGHT_ENV=local.");
  }
  const { FIRST_ADMIN_EMAIL: email, FIRST_ADMIN_PASSWORD: password } = value;
  return {
    production,
    development: value.NODE_ENV === "development",
    databaseUrl: value.DATABASE_URL,
    databaseAuthToken: value.DATABASE_AUTH_TOKEN,
    sessionSecret: value.SESSION_SECRET ?? localSecret(),
    appOrigin: value.APP_ORIGIN,
    trustedProxyHops: value.TRUSTED_PROXY_HOPS,
    logLevel: value.LOG_LEVEL,
    firstAdministrator: email && password ? { email, password } : undefined,
  };
}

const holder = globalThis as { pinwrightEnv?: Env };

/** The settings of this process, parsed once. */
export function env(): Env {
  holder.pinwrightEnv ??= parseEnv(process.env);
  return holder.pinwrightEnv;
}

/** Forget the parsed settings; tests change variables between runs. */
export function forgetEnv(): void {
  delete holder.pinwrightEnv;
}
