import { expect, type Page } from "@playwright/test";
import machines from "../data/machines.json" with { type: "json" };
import { readScreen, type Screen } from "./lead-card";

/** A machine of the bench: what is wrong with it, and what a meter reads at every check. */
export interface BenchMachine {
  readonly name: string;
  readonly truth: { readonly kind: string; readonly pins: Readonly<Record<string, number>>; readonly fault: { readonly code: string; readonly pins?: readonly number[] } };
  readonly readings: Readonly<Record<string, number | string>>;
}

const MACHINES = machines as readonly unknown[] as readonly BenchMachine[];

/** A bench machine by its name in data/machines.json. */
export function machine(name: string): BenchMachine {
  const found = MACHINES.find((one) => one.name === name);
  if (!found) throw new Error(`no machine named ${name}`);
  return found;
}

/** Starts a check on a device of which nothing is known but three cavities. Leaves the page on the first screen of the check. */
export async function startUnknown(page: Page): Promise<void> {
  await page.goto("/checks/new");
  await page.getByRole("button", { name: "Start the check" }).click();
  await readScreen(page);
  await expect(page).toHaveURL(/\/checks\/[0-9A-Z]{26}$/);
}

/** What a technician would type for a reading: "8.29k", "-0.011", "27.3". */
export function typed(check: string, value: number): string {
  if (check.startsWith("duty:")) return String(Number((value * 100).toFixed(2)));
  if (check.startsWith("res:") && value >= 1000) return `${Number((value / 1000).toPrecision(6))}k`;
  return String(value === 0 ? 0 : value);
}

const WORD_KEYS: Readonly<Record<string, RegExp>> = {
  OL: /^OL, over range/, none: /^No reading/, smooth: /^Smooth/, jumps: /^Jumps/, still: /^Still/, grips: /^Grips/, loose: /^Loose/,
};

export const field = (page: Page) => page.getByRole("textbox", { name: /^Reading/ });
export const enter = (page: Page) => page.getByRole("button", { name: "Enter", exact: true });

/** Gives the machine's reading for the check on the screen, and waits until the next screen is there. */
export async function giveReading(page: Page, bench: BenchMachine, check: string): Promise<Screen> {
  const value = bench.readings[check];
  if (value === undefined) throw new Error(`the bench has no reading for ${check}`);
  const before = await page.getByRole("heading", { level: 1 }).textContent();
  if (typeof value === "number") {
    await field(page).fill(typed(check, value));
    await enter(page).click();
  } else {
    await page.getByRole("button", { name: WORD_KEYS[value] ?? value }).click();
    if (value === "OL" || value === "none") await enter(page).click();
  }
  return nextAfter(page, { type: "reading", check }, before ?? "");
}

/** The next screen that is not the one just left. */
async function nextAfter(page: Page, left: Screen, heading: string): Promise<Screen> {
  let now = left;
  await expect(async () => {
    now = await readScreen(page);
    expect(now, `still on "${heading}"`).not.toEqual(left);
  }).toPass({ timeout: 15_000, intervals: [50] });
  return now;
}

/** Does what the screen asks for, and waits for the next one. */
async function answerOne(page: Page, bench: BenchMachine, screen: Screen): Promise<Screen> {
  return screen.type === "reading" ? giveReading(page, bench, screen.check) : passState(page);
}

/** Says that the machine is in the state that is asked for, and waits for the next screen. */
export async function passState(page: Page): Promise<Screen> {
  await page.getByRole("button", { name: /^Done/ }).click();
  return nextAfter(page, { type: "state" }, "Before the next reading");
}

/** Answers screen after screen until the check says that enough is known, or that nothing is left to read. */
export async function answerAll(page: Page, bench: BenchMachine, onScreen: (screen: Screen) => Promise<void> = async () => undefined): Promise<number> {
  let screen = await readScreen(page);
  let readings = 0;
  for (let step = 0; step < 60; step += 1) {
    await onScreen(screen);
    if (screen.type === "enough" || screen.type === "exhausted") return readings;
    if (screen.type === "reading") readings += 1;
    screen = await answerOne(page, bench, screen);
  }
  throw new Error("no end after 60 screens");
}

/** Past the state screens, to a card that takes a number or a word; says which check it asks for. */
export async function toReading(page: Page): Promise<string> {
  let screen = await readScreen(page);
  for (let step = 0; step < 4 && screen.type === "state"; step += 1) screen = await passState(page);
  if (screen.type !== "reading") throw new Error("no reading was asked for");
  return screen.check;
}

/** Gives the next so many readings, as they are asked for. */
export async function takeReadings(page: Page, bench: BenchMachine, count: number): Promise<void> {
  for (let taken = 0; taken < count; taken += 1) await giveReading(page, bench, await toReading(page));
}
