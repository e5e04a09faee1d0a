import type { Page } from "playwright-core";
import type { BenchCase } from "../../support/bench";
import { keysFor } from "./keys";

const MOST_SCREENS = 60, BETWEEN_KEYS_MS = 60;

interface Screen { readonly title: string; readonly check: string | null }

const screenOf = (page: Page): Promise<Screen> => page.evaluate(() => ({
  title: document.querySelector("main h1")?.textContent ?? "", check: document.querySelector("main [data-check]")?.getAttribute("data-check") ?? null,
}));

/** Where a button of the check is, brought into sight; the strip at the top and the bar at the bottom cover what is behind them. */
async function placeOf(page: Page, label: string): Promise<{ x: number; y: number }> {
  const place = await page.evaluate((wanted) => {
    const button = [...document.querySelectorAll<HTMLElement>("main button")].find((one) => (one.getAttribute("aria-label") ?? one.textContent ?? "").trim().startsWith(wanted));
    if (!button) return null;
    let box = button.getBoundingClientRect();
    const hit = document.elementFromPoint(box.x + box.width / 2, box.y + box.height / 2);
    if (!hit || !button.contains(hit)) {
      button.scrollIntoView({ block: "center", behavior: "instant" });
      box = button.getBoundingClientRect();
    }
    return { x: box.x + box.width / 2, y: box.y + box.height / 2 };
  }, label);
  if (!place) throw new Error(`no button "${label}" on the screen`);
  return place;
}

/** Presses as a finger does, by the browser's own input, so that what the page needs to answer it is measured. */
async function press(page: Page, label: string): Promise<void> {
  const { x, y } = await placeOf(page, label);
  await page.touchscreen.tap(x, y);
  await page.waitForTimeout(BETWEEN_KEYS_MS);
}

/** Presses and waits for the next screen; how long that took, in ms. */
async function pressOn(page: Page, label: string): Promise<number> {
  const { x, y } = await placeOf(page, label);
  await page.evaluate(() => window.bench.arm());
  await page.touchscreen.tap(x, y);
  return page.evaluate(() => window.bench.next);
}

/**
 * Takes the readings of a machine as they are asked for, until enough is known.
 * @returns for each reading the ms from its last key to the next screen
 */
export async function takeAll(page: Page, machine: BenchCase): Promise<number[]> {
  const waits: number[] = [];
  for (let i = 0; i < MOST_SCREENS; i++) {
    const { title, check } = await screenOf(page);
    if (check === null && title !== "Before the next reading") return waits;
    if (check === null) {
      await pressOn(page, "Done");
      continue;
    }
    const value = machine.readings[check];
    if (value === undefined) throw new Error(`the bench has no reading for ${check}`);
    const keys = keysFor(check, value);
    for (const key of keys.slice(0, -1)) await press(page, key);
    waits.push(await pressOn(page, keys.at(-1) ?? ""));
  }
  throw new Error(`${machine.id}: no end after ${MOST_SCREENS} screens`);
}
