import { AppError } from "./errors";

/** Largest body of a route, bytes. */
export const BODY_LIMIT = 256 * 1024;

const tooLarge = () => new AppError("body-too-large", "The request is larger than 256 KB. Send less at a time.", 413);
const malformed = () => new AppError("malformed-json", "The request's body is not JSON.", 400);

/** Reads at most the limit, whatever Content-Length claims. */
async function readLimited(request: Request): Promise<Uint8Array> {
  if (Number(request.headers.get("content-length") ?? 0) > BODY_LIMIT) throw tooLarge();
  const chunks: Uint8Array[] = [];
  let size = 0;
  const reader = request.body?.getReader();
  for (let part = await reader?.read(); part && !part.done; part = await reader?.read()) {
    const chunk = part.value as Uint8Array;
    size += chunk.byteLength;
    if (size > BODY_LIMIT) {
      await reader?.cancel();
      throw tooLarge();
    }
    chunks.push(chunk);
  }
  return Buffer.concat(chunks);
}

/**
 * The JSON body of a request that has one.
 * @throws AppError unsupported-media-type (415), body-too-large (413), malformed-json (400)
 */
export async function readJsonBody(request: Request): Promise<unknown> {
  if (request.method === "GET" || request.method === "HEAD") return undefined;
  const type = request.headers.get("content-type")?.split(";")[0]?.trim().toLowerCase();
  const bytes = await readLimited(request);
  if (bytes.byteLength === 0) return undefined;
  if (type !== "application/json") throw new AppError("unsupported-media-type", "Send the body as application/json.", 415);
  try {
    return JSON.parse(new TextDecoder("utf-8", { fatal: true }).decode(bytes));
  } catch {
    throw malformed();
  }
}
