import { describe, expect, it } from "vitest";
import { keysFor } from "./keys";

// Source of all values: worked by hand from what the keypad's keys are labelled.
describe("keys pressed for a reading", () => {
  it.each([
    ["volt:battery", 24.1, ["2", "4", "Decimal point", "1", "Enter"]],
    ["volt:harness:1-2", -0.011, ["0", "Decimal point", "0", "1", "1", "Plus or minus", "Enter"]],
    ["res:device:1-2@rest", 8290, ["8", "Decimal point", "2", "9", "Unit k\u03a9", "Enter"]],
    ["res:harness:1-gnd", 0.3, ["0", "Decimal point", "3", "Enter"]],
    ["duty:mated:3@rest", 0.273, ["2", "7", "Decimal point", "3", "Enter"]],
    ["freq:mated:3@rest", "none", ["No reading", "Enter"]],
    ["res:wire:2", "OL", ["OL, over range", "Enter"]],
    ["fit:contact:2", "grips", ["Grips"]],
  ] as const)("%s reads %s", (check, value, keys) => {
    expect(keysFor(check, value)).toEqual(keys);
  });
});
