import { Button, Field, Select, Sheet } from "@/components/ui";
import type { PossibilityChoice } from "@/lib/checks/possibilities";
import type { TellingCheck } from "@/lib/diagnosis";
import type { Labels } from "@/lib/checks/check-name";
import { TellingList } from "../evidence";

/** Two possibilities with what would tell them apart. */
export interface Apart { readonly pair: readonly [PossibilityChoice, PossibilityChoice]; readonly checks: readonly TellingCheck[] }

interface ApartSectionProps {
  readonly checkId: string;
  readonly choices: readonly PossibilityChoice[];
  readonly apart: Apart | null;
  /** Kept in the address when the form is sent. */
  readonly finding: string | undefined;
  readonly labels: Labels;
}

/** "What would tell these two apart?" for any two possibilities. A form that only asks; needs no script. */
export function ApartSection({ checkId, choices, apart, finding, labels }: ApartSectionProps) {
  if (choices.length < 2) return null;
  const option = ({ id, label }: PossibilityChoice) => <option key={id} value={id}>{label}</option>;
  return (
    <div className="print:hidden">
      <Sheet title="What would tell two apart" id="apart">
        <form method="get" action={`/checks/${checkId}#apart`} className="grid max-w-4xl gap-3 sm:grid-cols-[1fr_1fr_auto] sm:items-end">
          {finding ? <input type="hidden" name="finding" value={finding} /> : null}
          <Field label="This"><Select name="one" defaultValue={apart?.pair[0].id ?? choices[0]?.id}>{choices.map(option)}</Select></Field>
          <Field label="or this"><Select name="other" defaultValue={apart?.pair[1].id ?? choices[1]?.id}>{choices.map(option)}</Select></Field>
          <Button type="submit">Show</Button>
        </form>
        {apart ? <div className="mt-5"><TellingList checks={apart.checks} names={apart.pair.map(({ clause }) => clause)} labels={labels} /></div> : null}
      </Sheet>
    </div>
  );
}
