import { shareWords, type ChanceRow } from "@/lib/checks/chance-rows";
import { PRIOR_CHECKS } from "@/lib/diagnosis";

interface HowWorkedOutProps {
  readonly findings: readonly ChanceRow[];
  readonly ownChecks: number;
  /** Do own checks count at present? */
  readonly inUse: boolean;
}

/** The finding that the workshop met most often, worked out in numbers; none while nothing is confirmed. */
function Example({ findings, ownChecks }: Omit<HowWorkedOutProps, "inUse">) {
  const most = findings.reduce<ChanceRow | null>((best, row) => (row.own > (best?.own ?? 0) ? row : best), null);
  if (!most) return null;
  const published = PRIOR_CHECKS * most.published, whole = PRIOR_CHECKS + ownChecks;
  return (
    <p>
      For example, {most.title.toLowerCase()}: {published.toFixed(1)} of {PRIOR_CHECKS} published and {most.own} of {ownChecks} own
      make {(published + most.own).toFixed(1)} of {whole}, which is {shareWords((published + most.own) / whole)}.
    </p>
  );
}

/** How published shares and own checks come together, in words and one example. */
export function HowWorkedOut({ findings, ownChecks, inUse }: HowWorkedOutProps) {
  return (
    <div className="grid max-w-prose gap-2">
      <p>
        The published shares count as {PRIOR_CHECKS} checks; each confirmed check of this workshop counts as one more, for its finding
        and, where no entry had named it beforehand, for its kind.
      </p>
      {inUse ? <Example findings={findings} ownChecks={ownChecks} /> : null}
      <p>Every check keeps the chances that it began with. Findings that a kind of device cannot have are left out for it, and the rest grow in proportion.</p>
    </div>
  );
}
