import { describe, expect, it } from "vitest";
import { beliefs } from "@/lib/diagnosis/assess";
import { P, PARAMETER_COUNT } from "@/lib/diagnosis/circuit/parameters";
import { ALL_GROUPS, CHECK_INDEX, newPredictions, predictInto, WIDEST_PLAN } from "@/lib/diagnosis/circuit/predict";
import { physical } from "@/lib/diagnosis/inference/misfit";

/**
 * AC volts of a pulse train. Source: IEEE 181 and section 4 of the check values [computed there]: rms without the mean is
 * (high - low) x root(d (1 - d)): 1.5000 V of 5 V at 10 %, 1.9919 V of 4.6 V at 25 %, 6.0000 V of 12 V at 50 %, 1.3800 V of 4.6 V at 90 %.
 */
const TABLE = [[0.1, 5, 1.5], [0.25, 4.6, 1.9919], [0.5, 12, 6], [0.9, 4.6, 1.38]] as const;

function acOf(duty: number, swing: number): { readonly ac: number; readonly slack: number; readonly swing: number } {
  const c = beliefs({ pins: ["1", "2", "3"] }, []).map((b) => b.candidate).find((one) => one.family === "push-pull" && one.code === "none" && one.pull === "down" && one.pinOf[2] === 3)!;
  const x = physical(c, new Float64Array(PARAMETER_COUNT), new Float64Array(PARAMETER_COUNT)), p = newPredictions();
  // The output stands at 0.05 V when low and at its high level less 0.1 V when high; at half duty the mean tells the swing.
  x[P.supply] = 24; x[P.battery] = 24; x[P.high] = swing + 0.15; x[P.rest] = duty; x[P.full] = 0.5;
  predictInto(c, x, WIDEST_PLAN, ALL_GROUPS, p);
  const at = (check: string) => CHECK_INDEX.get(check)!;
  return { ac: p.value[at("ac:mated:3")]!, slack: p.slack[at("ac:mated:3")]!, swing: 2 * (p.value[at("volt:mated:3-gnd@full")]! - 0.05) };
}

describe("AC volts of a pulse train", () => {
  it.each(TABLE)("at duty %d of %d V are %d V rms", (duty, swing, rms) => {
    const shown = acOf(duty, swing);
    expect(shown.swing).toBeCloseTo(swing, 1);
    expect(shown.ac).toBeCloseTo(rms, 1);
  });

  // Form factor of a sine, 1.1107, times the mean of the rectified wave, 2 d (1 - d) of the swing (computed): 0.1 × 0.9 × 2 × 1.1107 × 5 = 1.000 V.
  it("allow for a meter that averages: 1.00 V at 10 % of 5 V, half a volt below its rms", () => {
    expect(acOf(0.1, 5).slack).toBeGreaterThan(0.49);
    expect(acOf(0.1, 5).slack).toBeLessThan(0.53);
  });
});
