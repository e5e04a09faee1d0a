"use client";

import { useEffect } from "react";
import { useForm } from "react-hook-form";
import { Button } from "@/components/ui";
import type { RunSetup } from "@/lib/checks/run";
import { EMPTY_SETUP, setupOf, type SetupChoices, type SetupEntry, type SetupValues } from "@/lib/checks/setup-form";
import { CautionsNotice, EntryCautions } from "./cautions-notice";
import { EntrySearch } from "./entry-search";
import { EntrySummary } from "./entry-summary";
import { PlaceFields, UnknownFields } from "./setup-fields";

interface SetupFormProps {
  readonly entry: SetupEntry | null;
  readonly choices: SetupChoices;
  readonly machineId: string;
  /** Key under which what is typed is kept across a reload. */
  readonly draftKey: string;
  /** Resolves once the run is kept on the phone; rejects where the browser keeps nothing. */
  readonly onStart: (setup: RunSetup) => Promise<void>;
}

type Mutable<T> = { -readonly [K in keyof T]: T[K] };

function storedValues(key: string): Partial<SetupValues> {
  try {
    const value: unknown = JSON.parse(window.sessionStorage.getItem(key) ?? "null");
    return typeof value === "object" && value !== null ? (value as Partial<SetupValues>) : {};
  } catch {
    return {};
  }
}

function useSetupForm({ choices, machineId, draftKey }: SetupFormProps) {
  const machine = choices.machines.find((one) => one.id === machineId);
  const form = useForm<Mutable<SetupValues>>({
    mode: "onTouched",
    defaultValues: { ...EMPTY_SETUP, machineId, battery: machine ? `${machine.batteryVolts} V` : "", meterId: choices.meters[0]?.id ?? "" } as Mutable<SetupValues>,
  });
  const { reset, subscribe } = form;
  useEffect(() => {
    reset((values) => ({ ...values, ...storedValues(draftKey) }));
    return subscribe({
      formState: { values: true },
      callback: ({ values }) => {
        try {
          window.sessionStorage.setItem(draftKey, JSON.stringify(values));
        } catch {
          return;
        }
      },
    });
  }, [reset, subscribe, draftKey]);
  return form;
}

/** "What do you have?": an entry, or what can be seen; everything but the three labels is optional. */
export function SetupForm(props: SetupFormProps) {
  const { entry, choices, draftKey, onStart } = props;
  const { register, handleSubmit, setValue, getValues, setError, watch, formState: { errors, isSubmitting } } = useSetupForm(props);
  const shapeId = watch("shape");
  const shape = choices.shapes.find((one) => one.id === shapeId) ?? null;

  useEffect(() => {
    // A face that is picked brings its usual labels, unless others were typed.
    if (!shape) return;
    const usual = [["1", "2", "3"], ...choices.shapes.map((one) => one.cavities.slice(0, 3).map((cavity) => cavity.label))].map((labels) => labels.join());
    const [a, b, c] = shape.cavities.map((cavity) => cavity.label);
    if (a && b && c && usual.includes(getValues("labels").join())) setValue("labels", [a, b, c]);
  }, [shape, choices.shapes, getValues, setValue]);

  const onMachine = (id: string) => {
    const machine = choices.machines.find((one) => one.id === id);
    if (machine) setValue("battery", `${machine.batteryVolts} V`);
  };
  const start = handleSubmit(async (values) => {
    try {
      await onStart(setupOf(values, entry, choices));
      window.sessionStorage.removeItem(draftKey);
    } catch {
      setError("root", { message: "This browser keeps nothing, so a check would be lost on a reload. Allow storage for this site, then start again." });
    }
  });

  return (
    <form noValidate onSubmit={(event) => void start(event)} className="grid max-w-3xl gap-6">
      {entry ? <EntrySummary entry={entry} /> : <EntrySearch />}
      {entry ? null : <UnknownFields register={register} errors={errors} choices={choices} shape={shape} />}
      <PlaceFields register={register} errors={errors} choices={choices} onMachine={onMachine} />
      <EntryCautions cautions={entry?.cautions ?? []} />
      <CautionsNotice />
      {errors.root ? <p role="alert" className="font-bold text-stop"><span aria-hidden="true">■ </span>{errors.root.message}</p> : null}
      <Button type="submit" tone="main" size="glove" busy={isSubmitting} busyLabel="Starting …" className="w-full flex-col gap-0 py-2">
        <span className="text-2xl">Start the check</span>
        <span className="text-base font-normal">None of the above applies here</span>
      </Button>
    </form>
  );
}
