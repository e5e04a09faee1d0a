/**
 * An error that may be shown: a stable code, a plain sentence that says what to do, and an HTTP status.
 * Everything else that is thrown is a defect: it is logged and answered with a general sentence.
 */
export class AppError extends Error {
  /** Next keeps a digest it finds, so an error page can tell a coded error from a defect. */
  readonly digest: string;

  constructor(
    /** Kebab-case, stable; clients may rely on it. */
    readonly code: string,
    message: string,
    /** 4xx for what the sender can put right. */
    readonly status: number,
    /** The input at fault, as a dotted path. */
    readonly field?: string,
    /** Every input at fault with its sentence. */
    readonly fields?: Readonly<Record<string, string>>,
  ) {
    super(message);
    this.name = "AppError";
    this.digest = code;
  }
}

export interface ErrorBody {
  readonly code: string;
  readonly message: string;
  readonly fields?: Readonly<Record<string, string>>;
}

/** What the outside may see of an error. */
export function errorBody(error: AppError): ErrorBody {
  const fields = error.fields ?? (error.field ? { [error.field]: error.message } : undefined);
  return { code: error.code, message: error.message, ...(fields ? { fields } : {}) };
}

export const notSignedIn = () => new AppError("not-signed-in", "Sign in first.", 401);
export const notAllowed = () => new AppError("not-allowed", "Your roles do not allow this. Ask an administrator of the workshop.", 403);
export const notFound = (what: string) => new AppError("not-found", `There is no such ${what}, or it is not yours to see.`, 404);
