import type { ReactNode } from "react";
import { Button, ButtonLink, Field, Select, TextInput } from "@/components/ui";
import { dayWords } from "@/lib/checks/date-words";
import { FINDING_TITLES, KIND_TITLES } from "@/lib/checks/finding-words";
import type { LogChoices } from "@/lib/checks/log-choices";
import { FAULT_CODES, KINDS } from "@/lib/diagnosis";

export type LogQuery = Readonly<Partial<Record<"machine" | "entry" | "person" | "kind" | "finding" | "state" | "from" | "to" | "after", string>>>;

interface Choice { readonly id: string; readonly name: string }

const STATES: readonly Choice[] = [{ id: "finished", name: "Finished" }, { id: "running", name: "Running, my own" }, { id: "abandoned", name: "Abandoned, my own" }];
const KIND_CHOICES = KINDS.map((id) => ({ id, name: KIND_TITLES[id] }));
const FINDING_CHOICES = FAULT_CODES.map((id) => ({ id, name: FINDING_TITLES[id] }));

function ChoiceField({ label, name, any, choices, value }: { label: string; name: string; any: string; choices: readonly Choice[]; value?: string }) {
  return (
    <Field label={label}>
      <Select name={name} defaultValue={value ?? ""}>
        <option value="">{any}</option>
        {choices.map((choice) => <option key={choice.id} value={choice.id}>{choice.name}</option>)}
      </Select>
    </Field>
  );
}

/** Is any filter on? The page of the log that is open does not count. */
export function activeFilters(query: LogQuery): number {
  return Object.entries(query).filter(([key, value]) => key !== "after" && value).length;
}

/** A day as people write it; what is no day is given back as it is. */
function dayOf(text: string): string {
  return Number.isNaN(Date.parse(text)) ? text : dayWords(text);
}

/** The filters that are on, in words; an id that no list holds is counted as "unknown". */
function activeWords(query: LogQuery, lists: Readonly<Partial<Record<keyof LogQuery, readonly Choice[]>>>): readonly string[] {
  const chosen = Object.entries(lists).flatMap(([key, list]) => {
    const value = query[key as keyof LogQuery];
    return value ? [list?.find((choice) => choice.id === value)?.name ?? `unknown ${key}`] : [];
  });
  return [...chosen, ...(query.from ? [`from ${dayOf(query.from)}`] : []), ...(query.to ? [`to ${dayOf(query.to)}`] : [])];
}

function Frame({ words, open, children }: { words: readonly string[]; open: boolean; children: ReactNode }) {
  return (
    <details open={open} className="group border-y-2 border-rule">
      <summary className="flex min-h-touch cursor-pointer list-none items-center justify-between gap-3 py-2 font-bold">
        <span>{words.length > 0 ? `Filter: ${words.join(", ")}` : "Filter"}</span>
        <span className="font-mono text-xl group-open:hidden" aria-hidden="true">+</span>
        <span className="hidden font-mono text-xl group-open:block" aria-hidden="true">−</span>
      </summary>
      <div className="pb-5">{children}</div>
    </details>
  );
}

/** Filters of the log as a plain form: they live in the address and work without script. */
export function LogFilters({ query, choices, open }: { query: LogQuery; choices: LogChoices; open: boolean }) {
  const machines = choices.machines.map((m) => ({ id: m.id, name: `${m.fleetNumber} ${m.name}` }));
  const words = activeWords(query, { machine: machines, entry: choices.entries, kind: KIND_CHOICES, finding: FINDING_CHOICES, person: choices.people, state: STATES });
  return (
    <Frame words={words} open={open}>
      {/* Choices are uncontrolled: a new address must give new defaults. */}
      <form key={JSON.stringify(query)} method="get" action="/checks" role="search" aria-label="Filter the log" className="grid gap-4 sm:grid-cols-2 lg:grid-cols-4">
        <ChoiceField label="Machine" name="machine" any="Any machine" choices={machines} value={query.machine} />
        <ChoiceField label="Entry" name="entry" any="Any entry, or none" choices={choices.entries} value={query.entry} />
        <ChoiceField label="Kind" name="kind" any="Any kind" choices={KIND_CHOICES} value={query.kind} />
        <ChoiceField label="Finding" name="finding" any="Any finding" choices={FINDING_CHOICES} value={query.finding} />
        <ChoiceField label="Person" name="person" any="Anybody" choices={choices.people} value={query.person} />
        <ChoiceField label="State" name="state" any="Any state" choices={STATES} value={query.state} />
        <Field label="From day"><TextInput type="date" name="from" defaultValue={query.from} /></Field>
        <Field label="To day"><TextInput type="date" name="to" defaultValue={query.to} /></Field>
        <div className="flex flex-wrap gap-3 sm:col-span-2 lg:col-span-4">
          <Button type="submit" tone="main">Show</Button>
          {words.length > 0 ? <ButtonLink href="/checks">Clear filters</ButtonLink> : null}
        </div>
      </form>
    </Frame>
  );
}
