import "server-only";
import { pino, type Logger } from "pino";
import { env } from "./env";

let logger: Logger | undefined;

/** The server's log: JSON lines on standard output. Never log passwords, cookies or e-mail addresses. */
export function log(): Logger {
  logger ??= pino({ level: env().logLevel, base: undefined });
  return logger;
}
