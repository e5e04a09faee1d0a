import { describe, expect, it } from "vitest";
import { EMPTY_DRAFT, loadDraft, saveDraft, type Draft } from "./draft";

function storage(): Pick<Storage, "getItem" | "setItem"> & { values: Map<string, string> } {
  const values = new Map<string, string>();
  return { values, getItem: (key) => values.get(key) ?? null, setItem: (key, value) => { values.set(key, value); } };
}
const draft: Draft = { chosen: "res:wire:2", typed: { check: "res:wire:2", text: "0.", unit: "Ω" }, carryOn: true };

describe("draft", () => {
  it("comes back as it was kept, for the same person and run only", () => {
    const store = storage();
    saveDraft(store, "p1", "r1", draft);
    expect(loadDraft(store, "p1", "r1")).toEqual(draft);
    expect(loadDraft(store, "p2", "r1")).toEqual(EMPTY_DRAFT);
    expect(loadDraft(store, "p1", "r2")).toEqual(EMPTY_DRAFT);
  });

  it.each(["not json", "[]", '{"chosen":1,"typed":null,"carryOn":false}', '{"chosen":null,"typed":{"check":"a"},"carryOn":false}'])("is empty when what is kept is %s", (text) => {
    const store = storage();
    saveDraft(store, "p1", "r1", draft);
    const key = [...store.values.keys()][0] ?? "";
    store.values.set(key, text);
    expect(loadDraft(store, "p1", "r1")).toEqual(EMPTY_DRAFT);
  });

  it("does not stop the check when storage is full", () => {
    expect(() => saveDraft({ setItem: () => { throw new Error("quota"); } }, "p1", "r1", draft)).not.toThrow();
  });
});
