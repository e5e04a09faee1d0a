import { rmSync } from "node:fs";

/** The browser tests' database goes when they are done. */
export default function removeBrowserFolder(): void {
  if (process.env.E2E_FOLDER) rmSync(process.env.E2E_FOLDER, { recursive: true, force: true });
}
