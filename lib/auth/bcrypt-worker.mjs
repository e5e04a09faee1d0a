// Hashing on a thread of its own: bcryptjs works in slices of 100 ms, and four sign-ins at once
// would keep the server's event loop from everybody else.
import { parentPort } from "node:worker_threads";
import bcrypt from "bcryptjs";

parentPort.on("message", ({ id, task, password, hash, cost }) => {
  try {
    const result = task === "compare" ? bcrypt.compareSync(password, hash) : bcrypt.hashSync(password, cost);
    parentPort.postMessage({ id, result });
  } catch (error) {
    parentPort.postMessage({ id, error: String(error) });
  }
});
