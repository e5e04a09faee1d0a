import type { ReactNode } from "react";
import type { CheckSpec } from "@/lib/diagnosis";
import type { KeypadKey } from "@/lib/checks/keypad-text";
import { UNIT_CHOICES } from "@/lib/checks/typed-reading";

interface KeyProps { readonly label: string; readonly children: ReactNode; readonly onPress: () => void; readonly className?: string; readonly pressed?: boolean }

function Key({ label, children, onPress, className = "", pressed }: KeyProps) {
  return (
    <button
      type="button" aria-label={label} aria-pressed={pressed} onClick={onPress}
      className={`tag-cut button button-plain min-h-glove min-w-0 px-0 font-mono text-3xl select-none ${className}`}
    >
      {children}
    </button>
  );
}

const DIGITS = ["7", "8", "9", "4", "5", "6", "1", "2", "3"] as const satisfies readonly KeypadKey[];
const COLUMN = ["col-start-1", "col-start-2", "col-start-3"];
/** On a short screen the first two rows are those of the field and of its error. */
const ROW = ["row-start-1 short:row-start-3", "row-start-2 short:row-start-4", "row-start-3 short:row-start-5"];

interface SideKey { readonly key: KeypadKey; readonly label: string; readonly face: ReactNode }

const CLEAR: SideKey = { key: "clear", label: "Clear the field", face: <span className="font-read text-lg">Clear</span> };
const SIGN: SideKey = { key: "sign", label: "Plus or minus", face: "\u00b1" };
const OVER: SideKey = { key: "OL", label: "OL, over range", face: "OL" };
const NONE: SideKey = { key: "none", label: "No reading", face: <span className="font-read text-base leading-tight">No<br />reading</span> };

/** The two keys under "back": what the meter may show beside a number. */
function sideKeys(unit: CheckSpec["unit"]): readonly [SideKey, SideKey] {
  if (unit === "ohm") return [OVER, SIGN];
  return unit === "volt" ? [CLEAR, SIGN] : [NONE, CLEAR];
}

interface KeypadProps {
  readonly unit: CheckSpec["unit"];
  readonly selected: string;
  readonly busy: boolean;
  readonly onKey: (key: KeypadKey) => void;
  readonly onUnit: (unit: string) => void;
  readonly onEnter: () => void;
}

/**
 * The check's own keypad: every key 96 px high or more, 8 px apart, for a gloved hand. Where the browser's bars leave a
 * phone too little height for four rows of them, Enter stands beside the field and three rows are left.
 */
export function Keypad({ unit, selected, busy, onKey, onUnit, onEnter }: KeypadProps) {
  const [upper, lower] = sideKeys(unit);
  return (
    <div role="group" aria-label="Keypad" className="grid grid-cols-5 grid-rows-4 gap-2 short:contents">
      {DIGITS.map((digit, i) => <Key key={digit} label={digit} onPress={() => onKey(digit)} className={`${COLUMN[i % 3]} ${ROW[Math.floor(i / 3)]}`}>{digit}</Key>)}
      <Key label="Back one" onPress={() => onKey("back")} className={`col-start-4 short:col-start-5 ${ROW[0]}`}><BackMark /></Key>
      <Key label={upper.label} onPress={() => onKey(upper.key)} className={`col-start-4 short:col-start-5 ${ROW[1]}`}>{upper.face}</Key>
      <Key label={lower.label} onPress={() => onKey(lower.key)} className={`col-start-4 short:col-start-5 ${ROW[2]}`}>{lower.face}</Key>
      <div role="group" aria-label="Unit" className="col-start-5 row-span-3 row-start-1 flex flex-col gap-2 short:col-start-6 short:row-start-3">
        {UNIT_CHOICES[unit].map((choice) => <Key key={choice} label={`Unit ${choice}`} pressed={choice === selected} onPress={() => onUnit(choice)} className="flex-1 text-2xl!">{choice}</Key>)}
      </div>
      <Key label="0" onPress={() => onKey("0")} className="col-start-1 row-start-4 short:col-start-4 short:row-span-2 short:row-start-4">0</Key>
      <Key label="Decimal point" onPress={() => onKey(".")} className="col-start-2 row-start-4 short:col-start-4 short:row-start-3">.</Key>
      <button
        type="submit" aria-disabled={busy || undefined} onClick={(event) => { event.preventDefault(); if (!busy) onEnter(); }}
        className="tag-cut button button-main col-span-3 col-start-3 row-start-4 min-h-glove text-2xl short:col-span-2 short:col-start-5 short:row-start-1 short:-mb-2 short:self-start"
      >
        Enter
      </button>
    </div>
  );
}

function BackMark() {
  return (
    <svg aria-hidden="true" viewBox="0 0 32 24" className="w-9" fill="none" stroke="currentColor" strokeWidth={2.5}>
      <path d="M10 2h20v20H10L2 12ZM15 8l9 8M24 8l-9 8" />
    </svg>
  );
}
