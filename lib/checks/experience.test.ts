import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { assess, chancesBefore, FAULT_CODES, FINDING_PRIORS, KIND_PRIORS, KINDS, PRIOR_CHECKS, vocabulary, type Experience, type Kind, type Reading } from "@/lib/diagnosis";
import { DAMP_PLACES, FAMILIES, FAULT_PLACES, type FaultPlace } from "@/lib/diagnosis/circuit/candidate";
import { barScale, chanceTable, shareWords, shiftWords } from "./chance-rows";
import { experienceSchema } from "./confirm-schemas";
import { countOutcomes, NO_EXPERIENCE, ownChecks, sameExperience, tidyExperience } from "./experience";
import { isOfKind, OUTCOME_GROUPS, outcomeId, outcomeOf, OUTCOMES } from "./outcome-choices";
import { engineSetup } from "./run-state";

const counts = fc.record({
  kinds: fc.dictionary(fc.constantFrom(...KINDS), fc.nat(500), { maxKeys: 3 }),
  findings: fc.dictionary(fc.constantFrom(...FAULT_CODES), fc.nat(500), { maxKeys: 16 }),
}) as fc.Arbitrary<Experience>;
const sum = (values: readonly number[]) => values.reduce((all, one) => all + one, 0);

describe("chances shifted by own checks", () => {
  // Posterior mean of a Dirichlet prior with multinomial counts: (alpha_i + n_i) / (alpha + n). Any textbook of Bayesian
  // statistics, e.g. Gelman et al., Bayesian Data Analysis, section 3.4; from memory.
  it("are the posterior means of a Dirichlet prior worth 100 checks", () => {
    fc.assert(fc.property(counts, ({ kinds, findings }) => {
      const after = chancesBefore({ kinds, findings });
      const whole = sum(FINDING_PRIORS.map((prior) => prior.share)), n = sum(Object.values(findings));
      for (const { code, share } of FINDING_PRIORS) expect(after.findings[code]).toBeCloseTo((PRIOR_CHECKS * share / whole + (findings[code] ?? 0)) / (PRIOR_CHECKS + n), 12);
      const wholeKinds = sum(KIND_PRIORS.map((prior) => prior.share)), nKinds = sum(Object.values(kinds));
      for (const { code, share } of KIND_PRIORS) expect(after.kinds[code]).toBeCloseTo((PRIOR_CHECKS * share / wholeKinds + (kinds[code] ?? 0)) / (PRIOR_CHECKS + nKinds), 12);
      expect(sum(Object.values(after.findings))).toBeCloseTo(1, 12);
    }));
  });

  it("by hand: PWM at 40 of 100 and ten own checks that were PWM make 50 of 110, and a potentiometer 38 of 110", () => {
    expect(chancesBefore({ kinds: { pwm: 10 }, findings: {} }).kinds.pwm).toBeCloseTo(50 / 110, 12);
    expect(chancesBefore({ kinds: { pwm: 10 }, findings: {} }).kinds.potentiometer).toBeCloseTo(38 / 110, 12);
  });

  it("shift a standing, and empty counts shift nothing, to the last bit", () => {
    const pins = ["1", "2", "3"] as const, readings: readonly Reading[] = [["res:wire:2", 0.2]];
    const chanceOf = (experience?: Experience) => {
      const answer = assess({ pins, ...(experience ? { experience } : {}) }, readings);
      if (answer.state === "invalid-input") throw new Error(answer.message);
      return answer;
    };
    const swapped = (answer: ReturnType<typeof chanceOf>) => sum(answer.faults.filter((fault) => fault.code === "wires-swapped").map((fault) => fault.p));
    expect(swapped(chanceOf({ kinds: {}, findings: { "wires-swapped": 40 } }))).toBeGreaterThan(2 * swapped(chanceOf()));
    expect(chanceOf(NO_EXPERIENCE)).toEqual(chanceOf());
  });
});

describe("counts", () => {
  it("have one form, in which nothing is nothing", () => {
    expect(tidyExperience(NO_EXPERIENCE)).toBeUndefined();
    expect(tidyExperience({ kinds: { pwm: 0 }, findings: { none: 0 } })).toBeUndefined();
    const messy: Experience = { kinds: { voltage: 1, potentiometer: 2, pwm: 0 }, findings: { "track-worn": 1, none: 3 } };
    expect(JSON.stringify(tidyExperience(messy))).toBe('{"kinds":{"potentiometer":2,"voltage":1},"findings":{"none":3,"track-worn":1}}');
    expect(sameExperience(messy, { kinds: { potentiometer: 2, voltage: 1 }, findings: { none: 3, "track-worn": 1 } })).toBe(true);
    expect(sameExperience(messy, NO_EXPERIENCE)).toBe(false);
    expect(sameExperience(undefined, NO_EXPERIENCE)).toBe(true);
  });

  it("count a kind only where no entry had named it, and pass over codes of another version", () => {
    const made = countOutcomes([
      { kind: "pwm", findingCode: "wire-open", countsKind: true }, { kind: "pwm", findingCode: "wire-open", countsKind: false },
      { kind: "loop", findingCode: "cosmic-ray", countsKind: true },
    ]);
    expect(made).toEqual({ kinds: { pwm: 1 }, findings: { "wire-open": 2 } });
    expect(ownChecks(made)).toBe(2);
  });

  it.each([
    { kinds: { pwm: -1 }, findings: {} }, { kinds: { pwm: 0.5 }, findings: {} }, { kinds: { pwm: 1e12 }, findings: {} }, { kinds: { loop: 1 }, findings: {} },
    { kinds: {}, findings: { gremlins: 3 } }, { kinds: {}, findings: { none: "3" } }, { kinds: {} }, { kinds: {}, findings: {}, more: 1 }, { kinds: [], findings: {} },
  ])("in a setup are bounded whole numbers of known codes: %j is refused", (given) => {
    expect(experienceSchema.safeParse(given).success).toBe(false);
  });

  it("reach the engine as they are kept, and not at all where there are none", () => {
    const run = (experience?: Experience) => engineSetup({ setup: { cavityLabels: ["1", "2", "3"], experience }, steps: [] }, vocabulary());
    expect(run({ kinds: {}, findings: { none: 2 } }).experience).toEqual({ kinds: {}, findings: { none: 2 } });
    expect(run(NO_EXPERIENCE)).not.toHaveProperty("experience");
    expect(run()).not.toHaveProperty("experience");
  });
});

describe("what a check may turn out to be", () => {
  it("is every finding of the engine at each of its places, and belongs to the same kinds", () => {
    const offered = OUTCOME_GROUPS.flatMap((group) => group.faults);
    expect(new Set(offered.map((fault) => fault.code))).toEqual(new Set(FAULT_CODES));
    const placesOf = (kind: Kind): readonly FaultPlace[] => FAMILIES[kind].flatMap((family) => [...FAULT_PLACES[family], ...DAMP_PLACES]);
    for (const code of FAULT_CODES) {
      for (const kind of KINDS) expect(isOfKind(code, kind), `${code} of ${kind}`).toBe(placesOf(kind).some((place) => place.code === code));
      const places = new Set(KINDS.flatMap((kind) => placesOf(kind).filter((place) => place.code === code).map((place) => (place.at < 0 ? "none" : place.at2 < 0 ? "one" : "two"))));
      expect([...places], code).toEqual([OUTCOMES[code].places]);
    }
  });

  it("is named by one text that leads back to it, and by no other", () => {
    for (const fault of OUTCOME_GROUPS.flatMap((group) => group.faults)) expect(outcomeOf(outcomeId(fault))).toEqual(fault);
    for (const id of ["", "wire-open", "wire-open:4", "wires-swapped:2,1", "none:1", "__proto__", "constructor"]) expect(outcomeOf(id)).toBeNull();
  });
});

describe("the table of chances", () => {
  it("sums to one before and after, names every source once, and shows own counts that are set aside", () => {
    const own: Experience = { kinds: { pwm: 2 }, findings: { "wire-open": 4, none: 1 } };
    for (const [table, moved] of [[chanceTable(own, own), true], [chanceTable(own, undefined), false]] as const) {
      for (const rows of [table.findings, table.kinds]) {
        expect(sum(rows.map((row) => row.published))).toBeCloseTo(1, 12);
        expect(sum(rows.map((row) => row.now))).toBeCloseTo(1, 12);
      }
      expect(new Set(table.sources.map((source) => source.text)).size).toBe(table.sources.length);
      const open = table.findings.find((row) => row.code === "wire-open");
      expect(open?.own).toBe(4);
      expect((open?.now ?? 0) > (open?.published ?? 0)).toBe(moved);
    }
  });

  it("says how far a chance was moved, and draws every bar within its scale", () => {
    expect(shareWords(0.13514)).toBe("13.5\u00a0%");
    expect([[0.1, 0.112], [0.1, 0.096], [0.0811, 0.0835], [0.1, 0.1], [0.1, 0.1001]].map(([published = 0, now = 0]) => shiftWords({ published, now }))).toEqual(["up 1.2 points", "down 0.4 points", "up 0.3 points", "as published", "up less than 0.1 points"]);
    const { findings, kinds } = chanceTable({ kinds: { pwm: 900 }, findings: {} }, { kinds: { pwm: 900 }, findings: {} });
    expect([barScale(findings), barScale(kinds)]).toEqual([0.3, 1]);
  });
});
