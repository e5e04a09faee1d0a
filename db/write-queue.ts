import { AsyncLocalStorage } from "node:async_hooks";

/** Runs one task at a time, in the order given; a task that fails does not stop the next. */
export class WriteQueue {
  #tail: Promise<unknown> = Promise.resolve();
  readonly #inside = new AsyncLocalStorage<true>();

  /** @throws Error when called from inside a task: it would wait for itself. */
  run<T>(task: () => Promise<T>): Promise<T> {
    if (this.#inside.getStore()) return Promise.reject(new Error("write() inside write(): pass the database on instead"));
    const result = this.#tail.then(() => this.#inside.run(true, task));
    this.#tail = result.catch(() => undefined);
    return result;
  }
}
