import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { seedEntries } from "@/seed/catalogue";
import { choiceOf, paramsOf, type SearchChoice, searchInputOf, toggled } from "./search-params";
import { searchEntriesSchema } from "./schemas";
import { foldWords, queryWords, searchTextOf } from "./words";

describe("words of a search", () => {
  it.each([
    ["TF-41/3 B", ["tf413", "b"]], ["BN/BU/BK", ["bn", "bu", "bk"]], ["brown-blue", ["brown", "blue"]], ["  Weed   CUTTER ", ["weed", "cutter"]],
    ["push-pull", ["pushpull"]], ["5 V", ["5", "v"]], ["---", []], ["", []], ["naïve", ["naive"]], ["a a a", ["a"]],
  ])("%j is looked for as %j", (q, words) => {
    expect(queryWords(q)).toEqual(words);
  });

  it("keeps a number with punctuation whole and in pieces", () => {
    expect(foldWords("TF-41/3")).toEqual(["tf413", "tf", "41", "3"]);
  });

  it("never gives more than eight words, nor anything but letters and digits", () => {
    fc.assert(fc.property(fc.string({ maxLength: 200, unit: "grapheme" }), (q) => {
      const words = queryWords(q);
      expect(words.length).toBeLessThanOrEqual(8);
      for (const word of words) expect(word).toMatch(/^[a-z0-9]+$/);
    }));
  });

  it("has every word of an entry's own part numbers and name", () => {
    for (const { data } of seedEntries()) {
      const text = searchTextOf(data);
      for (const typed of [...data.partNumbers, data.name, data.maker]) for (const word of queryWords(typed)) expect(text).toContain(word);
    }
  });
});

const texts = fc.array(fc.string({ minLength: 1, maxLength: 20 }), { maxLength: 4 });
const choices: fc.Arbitrary<SearchChoice> = fc.record({ q: fc.string({ maxLength: 50 }).filter((q) => q.trim() !== ""), page: fc.integer({ min: 1, max: 1000 }), kind: texts, quantity: texts, connector: texts, supply: texts, colour: texts });

describe("a search in the address", () => {
  it("comes back as it was written", () => {
    fc.assert(fc.property(choices, (choice) => {
      expect(choiceOf(new URLSearchParams(paramsOf(choice).toString()))).toEqual(choice);
    }));
  });

  it("reads any address without failing, into what the search takes", () => {
    fc.assert(fc.property(fc.string({ maxLength: 300 }), (address) => {
      expect(searchEntriesSchema.safeParse(choiceOf(new URLSearchParams(address))).success).toBe(true);
    }));
  });

  it("hands unknown names on, so that they are refused and not overlooked", () => {
    expect(searchEntriesSchema.safeParse(searchInputOf(new URLSearchParams("q=a&sort=name"))).success).toBe(false);
    expect(searchEntriesSchema.safeParse(searchInputOf(new URLSearchParams("q=a&kind=pwm&kind=voltage&page=2"))).data).toMatchObject({ q: "a", kind: ["pwm", "voltage"], page: 2 });
  });

  it("puts a facet in, takes it out, and goes back to the first page", () => {
    const start = choiceOf(new URLSearchParams("q=boom&page=3"));
    const once = toggled(start, "kind", "pwm");
    expect(once).toMatchObject({ page: 1, kind: ["pwm"], q: "boom" });
    expect(toggled(once, "kind", "pwm").kind).toEqual([]);
  });
});
