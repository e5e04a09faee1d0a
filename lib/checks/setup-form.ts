import type { ConnectorShape } from "@/lib/catalogue/entry-data";
import type { Expect, MeterSpec } from "@/lib/diagnosis";
import { parseColour, parseQuantity } from "@/lib/units";
import type { RunSetup } from "./run";

/** "What do you have?" as it is typed; everything is text until it is started. */
export interface SetupValues {
  readonly labels: readonly [string, string, string];
  readonly colours: readonly [string, string, string];
  /** Id of a generic face, or "" when it was not picked. */
  readonly shape: string;
  readonly senses: string;
  readonly battery: string;
  readonly machineId: string;
  readonly meterId: string;
  readonly note: string;
}

export const EMPTY_SETUP: SetupValues = {
  labels: ["1", "2", "3"], colours: ["", "", ""], shape: "", senses: "", battery: "", machineId: "", meterId: "", note: "",
};

/** The published version that a check starts from. */
export interface SetupEntry {
  readonly id: string;
  readonly versionId: string;
  readonly slug: string;
  readonly name: string;
  readonly expect: Expect;
  readonly labels: readonly [string, string, string];
  readonly colours: readonly [string, string, string];
  readonly connector: ConnectorShape;
  readonly cautions: readonly string[];
}

export interface SetupChoices {
  readonly machines: readonly { readonly id: string; readonly fleetNumber: string; readonly name: string; readonly batteryVolts: number }[];
  readonly meters: readonly { readonly id: string; readonly name: string; readonly spec: MeterSpec }[];
  readonly shapes: readonly ConnectorShape[];
}

/** What is wrong with one cavity label, or null. */
export function labelProblem(labels: readonly string[], i: number, shape: ConnectorShape | null): string | null {
  const label = (labels[i] ?? "").trim();
  if (label === "") return "Enter what is moulded beside the cavity, or 1, 2 and 3.";
  if (label.length > 8) return "A cavity label has at most 8 letters.";
  if (labels.some((other, j) => j !== i && other.trim() === label)) return `"${label}" is used twice. Give each cavity its own label.`;
  if (shape && shape.cavities.length > 3 && !shape.cavities.some((cavity) => cavity.label === label)) {
    return `This connector's cavities are ${shape.cavities.map((cavity) => cavity.label).join(", ")}.`;
  }
  return null;
}

/** What is wrong with a wire colour, or null; empty is "not said". */
export function colourProblem(text: string): string | null {
  if (text.trim() === "") return null;
  const parsed = parseColour(text);
  return parsed.ok ? null : parsed.message;
}

/** What is wrong with the battery voltage, or null; empty is "not said". Above 60 V d.c. this tool stops. */
export function batteryProblem(text: string): string | null {
  if (text.trim() === "") return null;
  const parsed = parseQuantity(text, "volt");
  if (!parsed.ok) return parsed.message;
  if (typeof parsed.value !== "number" || parsed.value <= 0) return "Enter the battery voltage, for example 12 V or 24 V.";
  return parsed.value > 60 ? "Stop: above 60 V d.c. not with this tool." : null;
}

function colourCode(text: string): string | null {
  const parsed = text.trim() === "" ? null : parseColour(text);
  return parsed?.ok ? parsed.code : null;
}

/** A face of three carries the labels that are moulded on this one; a larger one keeps its own. */
function relabelled(shape: ConnectorShape, labels: readonly [string, string, string]): ConnectorShape {
  if (shape.cavities.length !== 3) return shape;
  return { ...shape, cavities: shape.cavities.map((cavity, i) => ({ ...cavity, label: labels[i] ?? cavity.label })) };
}

function volts(text: string): number | undefined {
  const parsed = text.trim() === "" ? null : parseQuantity(text, "volt");
  return parsed?.ok && typeof parsed.value === "number" ? parsed.value : undefined;
}

function ofDevice(values: SetupValues, entry: SetupEntry | null, choices: SetupChoices): Partial<RunSetup> & Pick<RunSetup, "cavityLabels"> {
  if (entry) {
    const { id, versionId, name, expect, labels, colours, connector } = entry;
    return { cavityLabels: labels, entryId: id, entryVersionId: versionId, entryName: name, expect, wireColours: colours, connector };
  }
  const [a, b, c] = values.labels;
  const labels = [a.trim(), b.trim(), c.trim()] as const;
  const shape = choices.shapes.find((one) => one.id === values.shape);
  const [x, y, z] = values.colours;
  const colours = [colourCode(x), colourCode(y), colourCode(z)] as const;
  return {
    cavityLabels: labels,
    ...(shape ? { connector: relabelled(shape, labels) } : {}),
    ...(colours.some((code) => code !== null) ? { wireColours: colours } : {}),
    ...(values.senses.trim() ? { senses: values.senses.trim() } : {}),
  };
}

/** The run's setup from the form and, where there is one, the entry. Only for values that show no problem. */
export function setupOf(values: SetupValues, entry: SetupEntry | null, choices: SetupChoices): RunSetup {
  const machine = choices.machines.find((one) => one.id === values.machineId);
  const meter = choices.meters.find((one) => one.id === values.meterId);
  const batteryVolts = volts(values.battery);
  return {
    ...ofDevice(values, entry, choices),
    ...(machine ? { machineId: machine.id, machineName: `${machine.fleetNumber} ${machine.name}` } : {}),
    ...(meter ? { meterId: meter.id, meter: meter.spec } : {}),
    ...(batteryVolts !== undefined ? { batteryVolts } : {}),
    ...(values.note.trim() ? { note: values.note.trim() } : {}),
  };
}
