import "server-only";
import { headers } from "next/headers";
import { unstable_rethrow } from "next/navigation";
import { assertOwnRequest } from "./auth/own-origin";
import type { Permission, Person } from "./auth/permissions";
import { requirePermission } from "./auth/require-permission";
import { AppError, errorBody, type ErrorBody } from "./errors";
import { log } from "./log";
import { readJsonBody } from "./request-body";

export type ActionResult<T> = { readonly ok: true; readonly data: T } | { readonly ok: false; readonly error: ErrorBody };

/** An action as a form's state takes it: the answer before, and the form. */
export type FormAction = (last: ActionResult<unknown> | null, form: FormData) => Promise<ActionResult<unknown>>;

const DEFECT = new AppError("server-error", "Something went wrong here. Nothing was changed. Try again; if it stays, tell an administrator.", 500);

/** Coded errors pass; anything else is logged in full and answered with a general sentence. */
function toAppError(error: unknown, where: string): AppError {
  // Redirects and not-found travel as thrown values and are Next's to handle.
  unstable_rethrow(error);
  if (error instanceof AppError) return error;
  log().error({ err: error, where }, "unexpected error");
  return DEFECT;
}

/**
 * Wrap a verb as a server action: origin, permission, verb, mapped result. Never throws what a page cannot show.
 * @param permission what the person needs; null for the few actions open to the signed-out
 */
export function action<T>(permission: Permission, verb: (person: Person, input: unknown) => Promise<T>): (input: unknown) => Promise<ActionResult<T>> {
  return (input) => openAction(async () => verb(await requirePermission(permission), input), permission);
}

/** An action that authorises itself in its own way, such as signing in. */
export async function openAction<T>(run: () => Promise<T>, where: string): Promise<ActionResult<T>> {
  try {
    assertOwnRequest("POST", await headers());
    return { ok: true, data: await run() };
  } catch (error) {
    return { ok: false, error: errorBody(toAppError(error, where)) };
  }
}

export interface RouteCall<P> {
  readonly person: Person;
  /** Parsed JSON of the request; undefined for methods without one. */
  readonly body: unknown;
  readonly query: URLSearchParams;
  readonly params: P;
  readonly request: Request;
}

type RouteContext<P> = { readonly params: Promise<P> };

/**
 * Wrap a verb as a route handler. The handler returns what is sent as JSON, or a Response of its own.
 * Errors become `{ error: { code, message, fields? } }` with their status.
 */
export function route<P = Record<string, never>>(permission: Permission, handler: (call: RouteCall<P>) => Promise<unknown>) {
  return async (request: Request, context: RouteContext<P>): Promise<Response> => {
    try {
      assertOwnRequest(request.method, request.headers);
      const person = await requirePermission(permission);
      const body = await readJsonBody(request);
      const answer = await handler({ person, body, query: new URL(request.url).searchParams, params: await context.params, request });
      return answer instanceof Response ? answer : json(answer ?? null, 200);
    } catch (error) {
      const known = toAppError(error, `${request.method} ${new URL(request.url).pathname}`);
      return json({ error: errorBody(known) }, known.status);
    }
  };
}

function json(value: unknown, status: number): Response {
  return Response.json(value, { status, headers: { "Cache-Control": "no-store" } });
}
