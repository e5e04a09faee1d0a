import "server-only";
import { subscribe } from "node:diagnostics_channel";
import type { IncomingMessage } from "node:http";
import { migrateDatabase } from "@/db/migrate";
import { PEER_HEADER } from "./auth/request-facts";
import { env } from "./env";
import { addFirstAdministrator } from "./people/add-first-administrator";

const holder = globalThis as { pinwrightPeerHook?: true };

/**
 * Next passes on no socket address that a client could not have written itself (X-Forwarded-For), so the
 * server notes the peer of every request before Next sees it, over whatever was sent under that name.
 */
function notePeers(): void {
  if (holder.pinwrightPeerHook) return;
  holder.pinwrightPeerHook = true;
  subscribe("http.server.request.start", (message) => {
    const { request } = message as { request: IncomingMessage };
    request.headers[PEER_HEADER] = request.socket.remoteAddress ?? "unknown";
  });
}

async function prepare(): Promise<void> {
  const { firstAdministrator } = env();
  notePeers();
  await migrateDatabase();
  if (firstAdministrator) await addFirstAdministrator(firstAdministrator);
}

/**
 * Once a server process: settings checked, database migrated, first administrator made where asked for.
 * When that fails the process ends: left to itself, Next would go on listening and answer every request with 500.
 */
export async function startUp(): Promise<void> {
  try {
    await prepare();
  } catch (error) {
    process.stderr.write(`Pinwright does not start. ${error instanceof Error ? error.message : String(error)}\n`);
    process.exit(1);
  }
}
