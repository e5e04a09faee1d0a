/** Lets whatever else waits have its turn. A message comes round at once, where a timer in a browser waits 4 ms. */
function turn(): Promise<void> {
  return new Promise((resolve) => {
    const { port1, port2 } = new MessageChannel();
    port1.onmessage = () => {
      port1.close();
      resolve();
    };
    port2.postMessage(null);
  });
}

/**
 * Runs long work to its end, one step at a time, with a turn for others after each.
 * @param wanted asked before each step; once it says no, the work is given up and null returned
 */
export async function inSlices<T>(steps: Generator<void, T>): Promise<T>;
export async function inSlices<T>(steps: Generator<void, T>, wanted: () => boolean): Promise<T | null>;
export async function inSlices<T>(steps: Generator<void, T>, wanted: () => boolean = () => true): Promise<T | null> {
  while (wanted()) {
    const step = steps.next();
    if (step.done) return step.value;
    await turn();
  }
  return null;
}
