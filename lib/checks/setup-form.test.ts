import { describe, expect, it } from "vitest";
import { CONNECTOR_SHAPES } from "@/lib/catalogue/connector-shapes";
import { DEFAULT_METER } from "@/lib/diagnosis";
import { setupSchema } from "./schemas";
import { batteryProblem, colourProblem, EMPTY_SETUP, labelProblem, setupOf, type SetupChoices } from "./setup-form";

const choices: SetupChoices = {
  machines: [{ id: "m1", fleetNumber: "D-01", name: "Reed dredger", batteryVolts: 24 }],
  meters: [{ id: "meter1", name: "Bench meter", spec: DEFAULT_METER }], shapes: CONNECTOR_SHAPES,
};
const four = CONNECTOR_SHAPES.find((shape) => shape.cavities.length === 4) ?? null;

describe("what do you have", () => {
  it("starts with the labels alone", () => {
    expect(setupOf(EMPTY_SETUP, null, choices)).toEqual({ cavityLabels: ["1", "2", "3"] });
  });

  it("gives what was typed in the form that the server takes", () => {
    const setup = setupOf({
      labels: [" A", "B ", "C"], colours: ["brown", "bu/rd", ""], shape: "triangle-3-plug", senses: "bucket angle",
      battery: "24", machineId: "m1", meterId: "meter1", note: "",
    }, null, choices);
    expect(setup).toMatchObject({ cavityLabels: ["A", "B", "C"], wireColours: ["BN", "RDBU", null], batteryVolts: 24, machineId: "m1", meterId: "meter1" });
    expect(setup.connector?.cavities.map((cavity) => cavity.label)).toEqual(["A", "B", "C"]);
    expect(setupSchema.parse(setup)).toEqual(setup);
  });

  it("names a label that is missing, doubled, too long or not on the connector", () => {
    expect(labelProblem(["", "2", "3"], 0, null)).toMatch(/Enter/);
    expect(labelProblem(["A", "A", "3"], 1, null)).toMatch(/twice/);
    expect(labelProblem(["123456789", "2", "3"], 0, null)).toMatch(/8 letters/);
    expect(labelProblem(["1", "2", "9"], 2, four)).toMatch(/cavities are/);
    expect(labelProblem(["1", "2", "4"], 2, four)).toBeNull();
  });

  it("stops above 60 V d.c. and takes nothing for an answer", () => {
    expect(batteryProblem("60")).toBeNull();
    expect(batteryProblem("61 V")).toMatch(/^Stop/);
    expect(batteryProblem("")).toBeNull();
    expect(batteryProblem("0")).toMatch(/for example/);
    expect(batteryProblem("twelve")).not.toBeNull();
  });

  it("asks again for a colour of another scheme", () => {
    expect(colourProblem("sw")).not.toBeNull();
    expect(colourProblem("GNYE")).toBeNull();
    expect(colourProblem("")).toBeNull();
  });
});
