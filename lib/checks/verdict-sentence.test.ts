import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Fault, FaultChance } from "@/lib/diagnosis";
import { openKinds, SURE, verdictSentence, type Told } from "./verdict-sentence";

const LABELS = ["A", "B", "C"] as const;
const PINS = { supply: 1, ground: 2, signal: 3 } as const;
const OPEN_WIRE: Fault = { code: "wire-open", pins: [3] };
const CONTACT: Fault = { code: "contact-open", pins: [3] };

function standing(change: Partial<Told> = {}): Told {
  const openFindings: readonly FaultChance[] = [{ ...OPEN_WIRE, p: 0.99 }];
  return {
    kinds: [{ kind: "potentiometer", p: 0.99 }, { kind: "pwm", p: 0.01 }], pins: [{ ...PINS, p: 0.99 }],
    faults: openFindings, openFindings, hypotheses: [], others: [], overLimit: null, done: true, inseparable: false, kindsInseparable: false, next: [], ...change,
  };
}
const say = (change: Partial<Told> = {}) => verdictSentence(standing(change), LABELS, null);
const open = (...list: readonly (readonly [Fault, number])[]) => ({ openFindings: list.map(([fault, p]) => ({ ...fault, p })) });

describe("the verdict's sentence", () => {
  it("says flatly what is sure, with the place and its role", () => {
    expect(say()).toBe("It is a potentiometer with supply on A, ground on B and signal on C, and the wire of cavity C (signal) is open.");
  });

  it("calls a sound machine sound only as far as its readings go", () => {
    expect(say(open([{ code: "none" }, 0.97]))).toMatch(/, and every reading fits a sound device and sound wiring\.$/);
  });

  it("says most likely below 95 %, and names what is still possible", () => {
    const text = say(open([OPEN_WIRE, 0.8], [CONTACT, 0.16]));
    expect(text).toContain("most likely the wire of cavity C (signal) is open, though it is still possible that contact C (signal)");
  });

  it("does not choose between findings that no reading can tell apart", () => {
    const text = say({ ...open([{ code: "output-dead" }, 0.49], [{ code: "output-stuck-high" }, 0.49]), inseparable: true });
    expect(text).toContain("either the device's output is dead, or the device's output is stuck high: no reading with a meter tells these apart");
    expect(text).not.toContain("most likely");
  });

  it("says that it cannot be told yet when nothing stands out", () => {
    expect(say(open([OPEN_WIRE, 0.5], [CONTACT, 0.4], [{ code: "none" }, 0.08]))).toContain("it cannot be told yet whether");
  });

  it("counts what it does not list", () => {
    const many = Array.from({ length: 6 }, (_, i) => [{ code: "wire-open", pins: [(i % 3) + 1] } as Fault, 0.16] as const);
    expect(say(open(...many))).toContain("or one of 3 more");
  });

  it("leaves the roles out while the pins are not settled", () => {
    expect(say({ pins: [{ ...PINS, p: 0.7 }, { supply: 2, ground: 1, signal: 3, p: 0.3 }] })).toContain("most likely with supply on A, ground on B and signal on C, and the wire of cavity C is open");
    expect(say({ pins: [{ ...PINS, p: 0.5 }] })).toContain("its pins not settled");
  });

  const EITHER = { kinds: [{ kind: "voltage", p: 0.557 }, { kind: "pwm", p: 0.443 }, { kind: "potentiometer", p: 0 }] } as const;

  it("says the finding first where it is known and the kind is not, and that no meter tells the kinds apart", () => {
    expect(say({ ...EITHER, ...open([{ code: "short-to-ground", pins: [3] }, 0.999]), kindsInseparable: true })).toBe(
      "The wire of cavity C (signal) is shorted to ground; the device, with supply on A, ground on B and signal on C, is either an analogue voltage device or a PWM device: no reading with a meter tells these apart.");
  });

  it("does not say so where a reading would tell the kinds apart", () => {
    const text = say({ ...EITHER, ...open([{ code: "none" }, 0.99]) });
    expect(text).toBe("Every reading fits a sound device and sound wiring; the device, with supply on A, ground on B and signal on C, is either an analogue voltage device or a PWM device, which the readings so far do not tell.");
  });

  it("names what is left of each where neither kind nor finding is known", () => {
    expect(say({ ...EITHER, ...open([OPEN_WIRE, 0.5], [CONTACT, 0.46]), pins: [{ ...PINS, p: 0.5 }] })).toBe(
      "The device, its pins not settled, is either an analogue voltage device or a PWM device, and it cannot be told yet whether the wire of cavity C is open, or contact C of the mated connector does not touch.");
  });

  it("names every kind that is left", () => {
    expect(say({ kinds: [{ kind: "voltage", p: 0.4 }, { kind: "pwm", p: 0.35 }, { kind: "potentiometer", p: 0.25 }] })).toContain("is either an analogue voltage device, a PWM device or a potentiometer");
    expect(openKinds([{ kind: "voltage", p: 0.96 }, { kind: "pwm", p: 0.04 }])).toHaveLength(1);
  });

  it("asks for a reading again when the readings contradict each other, and concludes nothing", () => {
    const text = verdictSentence(standing(), LABELS, [{ check: "volt:mated:3-gnd@full" }]);
    expect(text).toBe('These readings contradict each other: take "Voltage, cavity C, back-probed, connector mated, actuator at full travel" again before anything is renewed.');
  });

  it("is never surer than the evidence: below 95 % nothing is stated flatly", () => {
    fc.assert(fc.property(fc.double({ min: 0.2, max: SURE, maxExcluded: true, noNaN: true }), (p) => {
      const kind = say({ kinds: [{ kind: "pwm", p }, { kind: "voltage", p: 1 - p }] });
      expect(kind).not.toMatch(/^It is/);
      const finding = say(open([OPEN_WIRE, p], [CONTACT, SURE - p]));
      expect(finding).toMatch(/most likely|cannot be told/);
    }));
  });
});
