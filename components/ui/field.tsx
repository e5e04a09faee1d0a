import { cloneElement, useId, type ComponentProps, type ReactElement, type ReactNode } from "react";

interface ControlProps {
  readonly id?: string;
  readonly "aria-describedby"?: string;
  readonly "aria-invalid"?: boolean | "true" | "false";
}

interface FieldProps {
  readonly label: ReactNode;
  /** Shown before anything goes wrong: the form expected, with its unit. */
  readonly hint?: ReactNode;
  /** What is wrong and what to enter instead. */
  readonly error?: ReactNode;
  /** One control; it receives id, aria-describedby and aria-invalid. */
  readonly children: ReactElement<ControlProps>;
}

/** Label, hint, control and error, tied together for screen readers. */
export function Field({ label, hint, error, children }: FieldProps) {
  const ownId = useId();
  const id = children.props.id ?? ownId;
  const described = [children.props["aria-describedby"], hint ? `${id}-hint` : null, error ? `${id}-error` : null].filter(Boolean).join(" ");
  return (
    <div className="grid gap-1">
      <label htmlFor={id} className="font-bold">{label}</label>
      {hint ? <p id={`${id}-hint`} className="text-quiet">{hint}</p> : null}
      {cloneElement(children, {
        id,
        "aria-describedby": described || undefined,
        "aria-invalid": error ? true : undefined,
      })}
      {error ? (
        <p id={`${id}-error`} role="alert" className="flex gap-2 font-bold text-stop">
          <span aria-hidden="true">■</span>
          <span>{error}</span>
        </p>
      ) : null}
    </div>
  );
}

/** One line of text. Never type=number: the phone's keypad may have no minus sign. */
export function TextInput({ className = "", type = "text", ...rest }: ComponentProps<"input">) {
  return <input {...rest} type={type} className={`control ${className}`} />;
}

/** A native choice list; children are option elements. */
export function Select({ className = "", ...rest }: ComponentProps<"select">) {
  return <select {...rest} className={`control ${className}`} />;
}

/** Several lines of text. */
export function TextArea({ className = "", rows = 3, ...rest }: ComponentProps<"textarea">) {
  return <textarea {...rest} rows={rows} className={`control ${className}`} />;
}

type CheckboxProps = Omit<ComponentProps<"input">, "type"> & { readonly label: ReactNode };

/** A tick box with its label as one target of at least 44 px. */
export function Checkbox({ label, className = "", ...rest }: CheckboxProps) {
  return (
    <label className={`flex min-h-touch cursor-pointer items-center gap-3 ${className}`}>
      <input {...rest} type="checkbox" className="size-6 shrink-0 accent-[var(--bench)]" />
      <span>{label}</span>
    </label>
  );
}
