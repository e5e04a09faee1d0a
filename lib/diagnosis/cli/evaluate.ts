import { createInterface } from "node:readline";
import { answerRequest } from "../index";

/** JSON lines in, JSON lines out, in order. A line that cannot be read gets an error line; nothing ends the run but the end of the input. */
function answerLine(line: string): unknown {
  let request: unknown;
  try {
    request = JSON.parse(line);
  } catch {
    return { error: { code: "not-json", message: "This line is not JSON.", where: "" } };
  }
  try {
    return answerRequest(request);
  } catch {
    return { error: { code: "engine-failed", message: "The engine could not assess this request.", where: "" } };
  }
}

for await (const line of createInterface({ input: process.stdin, crlfDelay: Infinity })) {
  if (line.trim() !== "") process.stdout.write(`${JSON.stringify(answerLine(line))}\n`);
}
