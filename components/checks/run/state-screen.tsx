"use client";

import { useState, type ReactNode } from "react";
import { Button } from "@/components/ui";
import type { SettledState, StateAction, Transition } from "@/lib/checks/run-transition";
import { stateWords } from "@/lib/checks/check-words";
import type { CheckSpec } from "@/lib/diagnosis";
import { ScreenHeading } from "./screen-heading";

interface ActionWords { readonly title: string; readonly how: string; readonly hurts: string }

/** What to do and what can hurt. Source: common practice of the trade; 29 CFR 1910.147(d) on stored energy. */
const WORDS: Readonly<Record<StateAction, ActionWords>> = {
  "power-off": {
    title: "Switch the power off",
    how: "Key off, battery switch off. Lock it out where anyone reaches in. Give capacitors a minute before you touch a pin.",
    hurts: "What is held up can drop: lower or block loads, relieve stored hydraulic pressure.",
  },
  "part-device": {
    title: "Part the device connector",
    how: "Release the latch and pull the bodies, not the wires. Look for water, green copper and bent pins.",
    hurts: "Hot pipes and sharp edges near the device.",
  },
  "part-controller": {
    title: "Part the controller connector",
    how: "Release its lock and lift it off square. Touch bare metal of the frame first, to lose your static charge.",
    hurts: "The controller's pins take milliamps: touch them with nothing.",
  },
  "mate-controller": {
    title: "Mate the controller connector",
    how: "Push it home until the lock closes. Leave no lead or test terminal in it.",
    hurts: "A pin that is pushed back or bent reads like an open wire.",
  },
  "mate-device": {
    title: "Mate the device connector",
    how: "Push it home until the latch clicks. Leave no test terminal in it.",
    hurts: "A pin that is pushed back or bent reads like an open wire.",
  },
  "power-on": {
    title: "Switch the power on",
    how: "Take the meter off ohms and set it to V DC first. Engine off unless the maker says otherwise.",
    hurts: "Nobody near what can move. Loads lowered or blocked, stored pressure relieved.",
  },
};

function Action({ action, number }: { readonly action: StateAction; readonly number: number }): ReactNode {
  const words = WORDS[action];
  return (
    <li className="flex gap-3 border-t-2 border-rule pt-3">
      <span aria-hidden="true" className="font-mono text-3xl leading-none font-bold text-bench">{number}</span>
      <div className="grid gap-1">
        <h2 className="text-xl leading-tight font-bold">{words.title}</h2>
        <p>{words.how}</p>
        <p className="bg-straw px-2 py-1 text-on-straw"><span aria-hidden="true">▲ </span><strong>Can hurt: </strong>{words.hurts}</p>
      </div>
    </li>
  );
}

interface StateScreenProps {
  readonly spec: CheckSpec;
  readonly transition: Transition;
  /** Resolves once the new state is kept on the phone. */
  readonly onConfirm: (end: SettledState) => Promise<void>;
}

/** What to do to the machine before the next reading, in the safe order, with one button that says it is done. */
export function StateScreen({ spec, transition, onConfirm }: StateScreenProps) {
  const [busy, setBusy] = useState(false);
  const confirm = async () => {
    setBusy(true);
    await onConfirm(transition.end);
    setBusy(false);
  };
  return (
    <section className="grid gap-3">
      <ScreenHeading screen={`state ${spec.code} ${transition.actions.join(" ")}`}>Before the next reading</ScreenHeading>
      <ol className="grid gap-3">
        {transition.actions.map((action, i) => <Action key={action} action={action} number={i + 1} />)}
      </ol>
      <p className="border-t-2 border-rule pt-3">Follow the site&rsquo;s rules, the maker&rsquo;s instructions and local law.</p>
      <Button tone="main" size="glove" busy={busy} onClick={() => void confirm()} className="w-full flex-col gap-0 py-2">
        <span className="text-2xl">Done</span>
        <span className="text-base font-normal">{stateWords(transition.end).join(" · ")}</span>
      </Button>
    </section>
  );
}
