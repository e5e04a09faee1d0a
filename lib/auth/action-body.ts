import { AppError } from "@/lib/errors";

/** Largest body of a form or action, bytes; next.config.mjs has the same. */
export const ACTION_LIMIT = 256 * 1024;

const ACTION_ID = /^[0-9a-f]{42}$/;

const malformed = () => new AppError("malformed-form", "The form cannot be read. Reload the page and try again.", 400);

/** Of React's encoding, what decodes whatever it says: undefined, numbers JSON lacks, dates, and a form, whose fields follow as _1_name. */
const HARMLESS = /^\$(undefined|NaN|-?Infinity|-0|D[^$]*|K[0-9a-f]+)$/;

/** Values that our own pages send; in text a leading $ is doubled. Everything else of the encoding can fail on decoding. */
function isPlain(value: unknown): boolean {
  if (typeof value === "string") return !value.startsWith("$") || value.startsWith("$$") || HARMLESS.test(value);
  if (Array.isArray(value)) return value.every(isPlain);
  if (value !== null && typeof value === "object") return Object.values(value).every(isPlain);
  return true;
}

function parseJson(text: FormDataEntryValue | null): unknown {
  if (typeof text !== "string") throw malformed();
  try {
    return JSON.parse(text) as unknown;
  } catch {
    throw malformed();
  }
}

/** With JavaScript: the arguments as text; with a form among them, as its field 0, and the form's own fields follow under a prefix. */
function assertArguments(text: FormDataEntryValue | null): void {
  const given = parseJson(text);
  if (!Array.isArray(given) || !isPlain(given)) throw malformed();
}

/** Without JavaScript: the page's hidden fields name the action and point at its bound state. */
function assertHiddenFields(form: FormData): void {
  for (const [key, value] of form.entries()) {
    const [, group, part] = /^\$ACTION_(\d+):(\d+)$/.exec(key) ?? [];
    if (group === undefined) continue;
    const given = parseJson(value);
    if (part === "0" ? !isReference(given, group, form) : !isPlain(given)) throw malformed();
  }
}

function isReference(given: unknown, group: string, form: FormData): boolean {
  if (given === null || typeof given !== "object" || !("id" in given) || !("bound" in given)) return false;
  const { id, bound } = given;
  if (typeof id !== "string" || !ACTION_ID.test(id)) return false;
  const part = typeof bound === "string" ? /^\$@(\d+)$/.exec(bound)?.[1] : undefined;
  return bound === null || (part !== undefined && form.has(`$ACTION_${group}:${part}`));
}

async function assertForm(request: Request, action: string | null): Promise<void> {
  const form = await request.clone().formData().catch(() => null);
  if (!form) throw malformed();
  if (action !== null) assertArguments(form.get("0"));
  else assertHiddenFields(form);
}

/**
 * What a page takes is a form of its own, or the arguments of one of its actions as text, of a bearable size and well
 * formed; checked before the framework decodes it, because what it cannot decode it answers with 500.
 * @throws AppError method-not-allowed (405), length-required (411), body-too-large (413), malformed-form (400)
 */
export async function assertActionBody(request: Request): Promise<void> {
  const type = request.headers.get("content-type") ?? "";
  const action = request.headers.get("next-action");
  const isForm = type.startsWith("multipart/form-data");
  const isText = action !== null && type.startsWith("text/plain");
  if (request.method !== "POST" || !(isForm || isText)) throw new AppError("method-not-allowed", "This address only shows a page and takes its own forms.", 405);
  const length = request.headers.get("content-length");
  if (length === null) throw new AppError("length-required", "The request does not say how long it is.", 411);
  if (Number(length) > ACTION_LIMIT) throw new AppError("body-too-large", "The form is larger than 256 KB.", 413);
  if (action !== null && !ACTION_ID.test(action)) throw malformed();
  if (isForm) await assertForm(request, action);
  else assertArguments(await request.clone().text());
}
