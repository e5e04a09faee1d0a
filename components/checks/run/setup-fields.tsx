import type { FieldErrors, UseFormRegister } from "react-hook-form";
import { Field, Select, TextArea, TextInput } from "@/components/ui";
import type { ConnectorShape } from "@/lib/catalogue/entry-data";
import { batteryProblem, colourProblem, labelProblem, type SetupChoices, type SetupValues } from "@/lib/checks/setup-form";
import { ShapePicker } from "./shape-picker";

interface PartProps {
  readonly register: UseFormRegister<SetupValues>;
  readonly errors: FieldErrors<SetupValues>;
  readonly choices: SetupChoices;
}

const PINS = [0, 1, 2] as const;
const ok = (problem: string | null): true | string => problem ?? true;

/** What can be seen of an unknown device: connector, cavity labels, wire colours, what it senses. */
export function UnknownFields({ register, errors, choices, shape }: PartProps & { readonly shape: ConnectorShape | null }) {
  return (
    <>
      <ShapePicker shapes={choices.shapes} field={register("shape")} />
      <fieldset>
        <legend className="text-lg font-bold">Cavities and wires</legend>
        <p className="mb-2 text-quiet">Labels as moulded beside the cavities. Colours as IEC 60757 letters (BN, BU, GNYE) or words; leave empty what you cannot see.</p>
        <div className="grid gap-3">
          {PINS.map((i) => (
            <div key={i} className="grid grid-cols-2 gap-3">
              <Field label={`Cavity ${i + 1}: label`} error={errors.labels?.[i]?.message}>
                <TextInput {...register(`labels.${i}`, { validate: (_, values) => ok(labelProblem(values.labels, i, shape)), deps: ["labels"] })} autoCapitalize="characters" autoComplete="off" className="font-mono" />
              </Field>
              <Field label="Wire colour" error={errors.colours?.[i]?.message}>
                <TextInput {...register(`colours.${i}`, { validate: (text) => ok(colourProblem(text)) })} autoCapitalize="characters" autoComplete="off" spellCheck={false} />
              </Field>
            </div>
          ))}
        </div>
      </fieldset>
      <Field label="What it senses" hint="For example lift arm angle, tank level, pedal position">
        <TextInput {...register("senses", { maxLength: { value: 120, message: "Keep it under 120 letters." } })} autoComplete="off" />
      </Field>
    </>
  );
}

/** Where the device is and what it is measured with. */
export function PlaceFields({ register, errors, choices, onMachine }: PartProps & { readonly onMachine: (id: string) => void }) {
  return (
    <>
      <div className="grid gap-4 sm:grid-cols-2">
        <Field label="Machine">
          <Select {...register("machineId", { onChange: (event: { target: { value: string } }) => onMachine(event.target.value) })}>
            <option value="">Not said</option>
            {choices.machines.map((machine) => <option key={machine.id} value={machine.id}>{machine.fleetNumber} {machine.name}</option>)}
          </Select>
        </Field>
        <Field label="Battery voltage" error={errors.battery?.message}>
          <TextInput {...register("battery", { validate: (text) => ok(batteryProblem(text)) })} inputMode="decimal" autoComplete="off" placeholder="12 V or 24 V" className="font-mono" />
        </Field>
      </div>
      <Field label="Meter" hint="Its limits of error decide what a reading can prove.">
        <Select {...register("meterId")}>
          <option value="">Not said: a common 6000-count meter</option>
          {choices.meters.map((meter) => <option key={meter.id} value={meter.id}>{meter.name}</option>)}
        </Select>
      </Field>
      <Field label="Note" hint="Work order, fault shown by the controller" error={errors.note?.message}>
        <TextArea {...register("note", { maxLength: { value: 1000, message: "Keep it under 1000 letters." } })} rows={2} />
      </Field>
    </>
  );
}
