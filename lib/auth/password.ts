import "server-only";
import path from "node:path";
import { Worker } from "node:worker_threads";
import { truncates } from "bcryptjs";
import { AppError } from "@/lib/errors";

/** Cost 11: about a quarter of a second a hash; OWASP's password storage cheat sheet asks for 10 or more. */
const COST = 11;

/** Compared against when nobody has the address, so that the answer takes as long: cost 11, of a random string. */
const NOBODY = "$2b$11$3r/GPTZ9UIDdFl2TlxRKRuu6zb.Za/yA7Syk7U7VDPVJk3UC3BYEi";

type Job = { readonly task: "compare"; readonly password: string; readonly hash: string } | { readonly task: "hash"; readonly password: string; readonly cost: number };
interface Answer { readonly id: number; readonly result?: unknown; readonly error?: string }
interface Waiting { readonly resolve: (value: unknown) => void; readonly reject: (error: Error) => void }

const holder = globalThis as { pinwrightHasher?: Hasher };

/** One worker thread, jobs in the order given. */
class Hasher {
  readonly #waiting = new Map<number, Waiting>();
  readonly #worker: Worker;
  #last = 0;

  constructor() {
    this.#worker = new Worker(path.join(/* turbopackIgnore: true */ process.cwd(), "lib", "auth", "bcrypt-worker.mjs"));
    this.#worker.unref();
    this.#worker.on("message", (answer: Answer) => this.#settle(answer));
    this.#worker.on("error", (error) => this.#fail(error instanceof Error ? error : new Error(String(error))));
    this.#worker.on("exit", () => this.#fail(new Error("The hashing thread ended.")));
  }

  run(job: Job): Promise<unknown> {
    const id = (this.#last += 1);
    // Referenced while it works, so that a short script does not end before its answer.
    this.#worker.ref();
    return new Promise((resolve, reject) => {
      this.#waiting.set(id, { resolve, reject });
      this.#worker.postMessage({ id, ...job });
    });
  }

  #settle({ id, result, error }: Answer): void {
    const waiting = this.#waiting.get(id);
    this.#waiting.delete(id);
    if (this.#waiting.size === 0) this.#worker.unref();
    if (error === undefined) waiting?.resolve(result);
    else waiting?.reject(new Error(error));
  }

  #fail(error: Error): void {
    if (holder.pinwrightHasher === this) delete holder.pinwrightHasher;
    for (const { reject } of this.#waiting.values()) reject(error);
    this.#waiting.clear();
  }
}

function hasher(): Hasher {
  holder.pinwrightHasher ??= new Hasher();
  return holder.pinwrightHasher;
}

/**
 * bcrypt reads 72 bytes and ignores the rest, so longer passwords are refused instead of cut.
 * @throws AppError password-too-long (400)
 */
export function assertPasswordLength(password: string): void {
  if (truncates(password)) {
    throw new AppError("password-too-long", "The password is longer than 72 bytes. Use a shorter one.", 400, "password");
  }
}

/** Hash a password for storing. */
export async function hashPassword(password: string): Promise<string> {
  assertPasswordLength(password);
  return String(await hasher().run({ task: "hash", password, cost: COST }));
}

/** Does the password fit? With no hash the same work is done and the answer is no. */
export async function passwordFits(password: string, hash: string | null): Promise<boolean> {
  assertPasswordLength(password);
  const fits = await hasher().run({ task: "compare", password, hash: hash ?? NOBODY });
  return fits === true && hash !== null;
}
