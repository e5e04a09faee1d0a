import { expect, type Page } from "@playwright/test";

/** What is on the running check's screen, as a technician reads it off. */
export type Screen = { readonly type: "state" | "enough" | "exhausted" } | { readonly type: "reading"; readonly check: string };

const PLACES: readonly (readonly [words: RegExp, place: string])[] = [
  [/^device pin (\d)$/, "device"], [/^harness cavity (\d)$/, "harness"], [/^back of cavity (\d)$/, "mated"],
  [/^controller-side cavity for (\d)$/, "wire"], [/^battery (positive|negative)$/, "battery"],
];

function lead(lines: readonly string[], colour: "red" | "black"): { place: string; end: string } {
  // The lead's drawn tag brings its letter in front.
  const line = new RegExp(`^[RB]?${colour} lead on (.+)$`);
  const words = lines.map((one) => line.exec(one)?.[1]).find((one) => one !== undefined)?.trim() ?? "";
  for (const [pattern, place] of PLACES) {
    const end = pattern.exec(words)?.[1];
    if (end) return { place, end: end === "negative" ? "gnd" : end };
  }
  throw new Error(`no ${colour} lead on the card: ${lines.join(" | ")}`);
}

const POSITION: Readonly<Record<string, string>> = { "at rest": "@rest", "at full travel": "@full" };

/** The bench's name of the check that the card asks for, from its heading and its lines. Throws when the card does not say. */
export function checkOnCard(title: string, card: readonly string[]): string {
  const [measure, where] = title.split(", ");
  const position = POSITION[where ?? ""] ?? "";
  if (measure === "Grip") return `fit:contact:${/harness contact (\d)/.exec(card.join(" "))?.[1] ?? "?"}`;
  const red = lead(card, "red");
  if (measure === "Sweep") return `sweep:mated:${red.end}`;
  if (measure === "Frequency") return `freq:mated:${red.end}${position}`;
  if (measure === "Duty") return `duty:mated:${red.end}${position}`;
  if (red.place === "battery") return "volt:battery";
  if (red.place === "wire") return `res:wire:${red.end}`;
  // The same two cavities: with the controller parted too it is the insulation that is measured.
  const place = red.place === "harness" && card.some((line) => /controller parted/i.test(line)) ? "loose" : red.place;
  return `${measure === "Resistance" ? "res" : "volt"}:${place}:${red.end}-${lead(card, "black").end}${position}`;
}

/** Heading and lines of the screen in one look, so that they belong to the same screen; null while there is nothing to read. */
async function look(page: Page): Promise<{ title: string; lines: string[] } | null> {
  return page.evaluate(() => {
    const heading = document.querySelector("main h1");
    const title = heading?.textContent?.trim() ?? "";
    if (title === "" || /Working out|Opening|What do you have/.test(title)) return null;
    return { title, lines: [...(heading?.closest("section")?.querySelectorAll("p") ?? [])].map((line) => line.textContent?.trim() ?? "") };
  });
}

/** Waits until the check has something to say, and reads it. */
export async function readScreen(page: Page): Promise<Screen> {
  let seen: Awaited<ReturnType<typeof look>> = null;
  await expect(async () => {
    seen = await look(page);
    expect(seen, "a screen of the check").not.toBeNull();
  }).toPass({ timeout: 15_000, intervals: [50] });
  const { title, lines } = seen ?? { title: "", lines: [] as string[] };
  if (title === "Before the next reading") return { type: "state" };
  if (title === "Enough is known") return { type: "enough" };
  if (title.startsWith("No reading is left")) return { type: "exhausted" };
  return { type: "reading", check: checkOnCard(title, lines) };
}
