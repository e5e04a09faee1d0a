"use client";

import { useEffect, useId, useRef, useState, type KeyboardEvent } from "react";
import type { CheckSpec, ReadingValue } from "@/lib/diagnosis";
import { pressKey, type KeypadKey } from "@/lib/checks/keypad-text";
import { isBareNumber, readTyped, UNIT_CHOICES } from "@/lib/checks/typed-reading";
import type { Draft } from "@/lib/offline/draft";
import { uncover } from "./bring-up";
import { Keypad } from "./keypad";

interface ReadingEntryProps {
  readonly spec: CheckSpec;
  readonly typed: Draft["typed"];
  readonly onTyped: (typed: Draft["typed"]) => void;
  /** Resolves once the reading is kept on the phone. */
  readonly onReading: (value: ReadingValue, typed: string) => Promise<void>;
}

/** One field for the reading, fed by the keypad below it, the phone's keyboard or dictation. */
export function ReadingEntry({ spec, typed, onTyped, onReading }: ReadingEntryProps) {
  const [error, setError] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const mine = typed?.check === spec.code ? typed : null;
  const text = mine?.text ?? "";
  const unit = mine?.unit ?? UNIT_CHOICES[spec.unit][0] ?? "";

  const change = (nextText: string, nextUnit = unit) => {
    setError(null);
    onTyped({ check: spec.code, text: nextText, unit: nextUnit });
  };
  const enter = async () => {
    if (busy) return;
    const read = readTyped(spec, text, unit);
    if (!read.ok) {
      setError(read.message);
      return;
    }
    setBusy(true);
    await onReading(read.value, read.typed);
    setBusy(false);
  };

  return (
    <form noValidate className="grid grid-cols-1 gap-2 short:grid-cols-6" onSubmit={(event) => { event.preventDefault(); void enter(); }}>
      <ReadingField text={text} unit={unit} error={error} onChange={change} />
      <Keypad
        unit={spec.unit} selected={unit} busy={busy}
        onKey={(key: KeypadKey) => change(pressKey(text, key))} onUnit={(choice) => change(text, choice)} onEnter={() => void enter()}
      />
    </form>
  );
}

interface ReadingFieldProps { readonly text: string; readonly unit: string; readonly error: string | null; readonly onChange: (text: string) => void }

/** The reading as it is typed, 40 px high; the selected unit stands beside a bare number only. */
function ReadingField({ text, unit, error, onChange }: ReadingFieldProps) {
  const id = useId();
  const place = useRef<HTMLDivElement>(null);
  const shownUnit = text === "" || isBareNumber(text) ? unit : "";
  useEffect(() => {
    // Enter may have been reached by scrolling: what is wrong must not stay behind the standing.
    if (error && place.current) uncover(place.current);
  }, [error]);
  return (
    <div className="grid grid-cols-1 gap-1 short:contents">
      {/* On a short screen: row 1 with Enter beside it; row 2 is the error's, and its gap is taken back while it is empty. */}
      <div ref={place} className={`relative flex short:col-span-4 short:row-start-1 short:-mb-2 min-h-glove items-center border-2 bg-sheet has-focus-visible:outline-3 has-focus-visible:outline-offset-3 has-focus-visible:outline-bench ${error ? "border-4 border-stop" : "border-rule"}`}>
        <label htmlFor={id} className="self-stretch pt-2 pl-3 text-lg text-quiet short:absolute short:top-0 short:left-0 short:pt-1">Reading<span className="sr-only">{unit ? `, in ${unit} unless you type another unit` : ""}</span></label>
        <input
          id={id} value={text} onChange={(event) => onChange(event.target.value)} inputMode="decimal" autoComplete="off" autoCorrect="off" spellCheck={false}
          enterKeyHint="enter" maxLength={40} aria-invalid={error ? true : undefined} aria-describedby={error ? `${id}-error` : undefined}
          className="min-w-0 flex-1 self-stretch bg-transparent px-3 text-right font-mono text-[2.75rem] leading-none font-bold text-ink outline-none! short:pt-6 short:pr-1.5 short:text-[2.5rem]"
        />
        {shownUnit ? <span aria-hidden="true" className="min-w-14 pr-3 font-mono text-[2.75rem] leading-none short:min-w-10 short:pt-6 short:text-[2.5rem]">{shownUnit}</span> : null}
      </div>
      {error ? <p id={`${id}-error`} role="alert" className="flex gap-2 font-bold text-stop short:col-span-6 short:row-start-2 short:pt-1"><span aria-hidden="true">■</span><span>{error}</span></p> : null}
    </div>
  );
}

/** A digit typed anywhere on the reading's screen belongs in the field: moves the focus there before the character arrives. */
export function typeAhead(event: KeyboardEvent<HTMLElement>): void {
  const target = event.target as HTMLElement;
  const plain = !event.ctrlKey && !event.metaKey && !event.altKey && /^[\d.,+-]$/.test(event.key);
  if (!plain || target.closest("input, textarea, select, dialog")) return;
  event.currentTarget.querySelector<HTMLInputElement>("input[inputmode=decimal]")?.focus();
}
