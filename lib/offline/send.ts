import type { SendResult } from "./outbox";

/** Answers that say "later", not "never". */
const PASSING = new Set([408, 425, 429]);

async function refusal(response: Response): Promise<SendResult> {
  const body: unknown = await response.json().catch(() => null);
  const error = typeof body === "object" && body !== null && "error" in body ? body.error : null;
  const field = (name: string): string | null =>
    typeof error === "object" && error !== null && name in error ? String((error as Record<string, unknown>)[name]) : null;
  return { type: "refused", code: field("code") ?? `http-${response.status}`, message: field("message") ?? "The server did not take this check." };
}

/** Posts JSON to the own server within 15 s. Never throws: no answer, a server fault or a full server is "offline". */
export async function sendToServer(path: string, body: unknown): Promise<SendResult> {
  try {
    const response = await fetch(path, {
      method: "POST", headers: { "content-type": "application/json" }, body: JSON.stringify(body),
      redirect: "manual", signal: AbortSignal.timeout(15_000),
    });
    if (response.ok) return { type: "ok" };
    if (response.status === 401) return { type: "signed-out" };
    if (response.type === "opaqueredirect") return { type: "signed-out" };
    if (response.status >= 500 || PASSING.has(response.status)) return { type: "offline" };
    return await refusal(response);
  } catch {
    return { type: "offline" };
  }
}
