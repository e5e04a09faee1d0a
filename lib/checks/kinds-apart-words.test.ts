import { describe, expect, it } from "vitest";
import { alikeKindsWords } from "./kinds-apart-words";

describe("where no reading tells the kinds apart", () => {
  it("says when the kind will show, if one finding outside the device hides it", () => {
    expect(alikeKindsWords([{ code: "short-to-ground" }])).toBe("They read alike at every check while this finding stands. Mend it, then make a re-check: a device that runs shows its kind.");
  });

  it("promises nothing where the device itself is at fault, nothing is, or more than one finding is left", () => {
    for (const open of [[{ code: "output-dead" }], [{ code: "none" }], [{ code: "wire-open" }, { code: "contact-open" }], []] as const) expect(alikeKindsWords(open)).toBe("They read alike at every check.");
  });
});
