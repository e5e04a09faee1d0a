"use client";

import { optionalVocabulary, vocabulary, type CheckSpec } from "@/lib/diagnosis";
import { checkTitle, measuredWords, stateWords, type Labels } from "@/lib/checks/check-words";
import { Dialog } from "./dialog";

interface Group { readonly name: string; readonly specs: readonly CheckSpec[] }

function groups(specs: readonly CheckSpec[]): readonly Group[] {
  const byState = new Map<string, CheckSpec[]>();
  for (const spec of specs) {
    const name = stateWords(spec.state).join(" · ") || "any state, nothing measured";
    byState.set(name, [...(byState.get(name) ?? []), spec]);
  }
  return [...byState].map(([name, list]) => ({ name, specs: list }));
}

/** The checks of a group by what is measured. */
function measures(specs: readonly CheckSpec[]): readonly (readonly [string, readonly CheckSpec[]])[] {
  const names = [...new Set(specs.map(measuredWords))];
  return names.map((name) => [name, specs.filter((spec) => measuredWords(spec) === name)] as const);
}

/** The marks a check carries in the list, in words. */
function note(code: string, taken: ReadonlyMap<string, string>, excluded: ReadonlySet<string>): string | null {
  const reading = taken.get(code);
  if (reading) return `taken: ${reading}`;
  return excluded.has(code) ? "set aside" : null;
}

interface ChecksDialogProps {
  readonly open: boolean;
  readonly labels: Labels;
  readonly taken: ReadonlyMap<string, string>;
  readonly excluded: ReadonlySet<string>;
  readonly onClose: () => void;
  readonly onChoose: (code: string) => void;
}

/** Every check of the vocabulary, grouped by the state that the machine must be in; any may be taken out of turn. */
export function ChecksDialog({ open, labels, taken, excluded, onClose, onChoose }: ChecksDialogProps) {
  return (
    <Dialog open={open} title="Another reading" onClose={onClose}>
      <p>Take any reading you like. Where the machine must change first, you are told how.</p>
      {groups([...vocabulary(), ...optionalVocabulary()]).map((group) => (
        <details key={group.name} className="border-t-2 border-rule">
          <summary className="flex min-h-glove cursor-pointer items-center gap-3 text-lg font-bold">
            <span aria-hidden="true" className="font-mono text-2xl">+</span>
            <span className="first-letter:uppercase">{group.name} <span className="font-normal text-quiet">({group.specs.length})</span></span>
          </summary>
          {measures(group.specs).map(([measure, specs]) => (
            <section key={measure}>
              <h3 className="py-2 font-bold">{measure}</h3>
              <ul className="grid gap-2 pb-4">
                {specs.map((spec) => <CheckRow key={spec.code} title={checkTitle(spec, labels)} note={note(spec.code, taken, excluded)} onChoose={() => onChoose(spec.code)} />)}
              </ul>
            </section>
          ))}
        </details>
      ))}
    </Dialog>
  );
}

function CheckRow({ title, note: mark, onChoose }: { readonly title: string; readonly note: string | null; readonly onChoose: () => void }) {
  return (
    <li>
      <button type="button" onClick={onChoose} className="tag-cut button button-plain min-h-glove w-full flex-col items-start gap-0 px-4 text-left">
        <span>{title}</span>
        {mark ? <span className="font-normal text-quiet">{mark}</span> : null}
      </button>
    </li>
  );
}
