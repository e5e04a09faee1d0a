import { describe, expect, it } from "vitest";
import { setupSchema } from "@/lib/checks/schemas";
import { stepProblem } from "@/lib/checks/step-rules";

const reading = (value: number) => stepProblem({ id: "1", at: "2026-11-02T09:00:00Z", type: "reading", check: "volt:battery", value, typed: String(value) });

describe("60 V d.c. is where the tool stops", () => {
  // Source: warnings of hand-held meters and the voltage class B of ISO 6469-3 (above 60 V d.c. or 30 V a.c.), read.
  it("takes readings up to 60 V of either sign and refuses more with the word stop", () => {
    for (const volts of [0, 28.4, 60, -60]) expect(reading(volts)).toBeNull();
    for (const volts of [60.1, 400, -61]) expect(reading(volts)?.message).toMatch(/stop/i);
  });

  it("takes no machine with a battery above it", () => {
    const setup = (batteryVolts: number) => ({ cavityLabels: ["1", "2", "3"], batteryVolts });
    expect(setupSchema.safeParse(setup(48)).success).toBe(true);
    expect(setupSchema.safeParse(setup(80)).success).toBe(false);
  });
});
