import { chanceText, DataTable, PinTag } from "@/components/ui";
import type { Labels } from "@/lib/checks/check-name";
import { roleOf } from "@/lib/checks/finding-words";
import type { RunSetup } from "@/lib/checks/run";
import type { Verdict } from "@/lib/checks/verdict";
import type { PinNumber, PinsChance } from "@/lib/diagnosis";

const PINS: readonly PinNumber[] = [1, 2, 3];

/** Chance that a pin has a role, over all assignments. */
function roleChance(pins: readonly PinsChance[], pin: PinNumber, role: ReturnType<typeof roleOf>): number {
  const sum = pins.reduce((chance, assignment) => (roleOf(assignment, pin) === role ? chance + assignment.p : chance), 0);
  // Sums of binary fractions may end a hair above one.
  return Math.min(1, sum);
}

interface PinsTableProps { readonly verdict: Verdict; readonly setup: RunSetup; readonly captionHidden?: boolean }

/** What each pin of the device is, by the best assignment, with the chance of each role. */
export function PinsTable({ verdict, setup, captionHidden = true }: PinsTableProps) {
  const best = verdict.pins[0];
  const labels: Labels = setup.cavityLabels;
  if (!best) return <p>The pins are not settled by these readings.</p>;
  const colours = setup.wireColours?.some((colour) => colour !== null) ? setup.wireColours : null;
  const rows = PINS.map((pin) => {
    const role = roleOf(best, pin);
    return {
      key: String(pin),
      cells: {
        cavity: <span className="font-mono text-xl">{labels[pin - 1]}</span>,
        role: <span className="flex items-center gap-2"><PinTag role={role} /><span aria-hidden="true">{role}</span></span>,
        colour: colours?.[pin - 1] ?? "not noted",
        chance: chanceText(roleChance(verdict.pins, pin, role)),
      },
    };
  });
  const columns = [
    { key: "cavity", header: "Cavity" }, { key: "role", header: "Is" },
    ...(colours ? [{ key: "colour", header: "Wire" }] : []), { key: "chance", header: "Chance", numeric: true },
  ];
  return <DataTable caption="What each pin is" captionHidden={captionHidden} columns={columns} rows={rows} />;
}
