import type { Page } from "@playwright/test";

/** What the browser complains of from now on: scripts and styles stopped by the content security policy, errors of our own. */
export function complaints(page: Page): readonly string[] {
  const heard: string[] = [];
  page.on("console", (message) => { if (message.type() === "error") heard.push(message.text()); });
  page.on("pageerror", (error) => heard.push(error.message));
  return heard;
}
