"use client";

import type { FacetGroup, FacetOption } from "@/lib/catalogue/search-result";
import { WireSwatch } from "./wire-swatch";

interface FacetPanelProps {
  readonly groups: readonly FacetGroup[];
  /** What is chosen now; the groups' counts may still be those of the answer before. */
  readonly isChosen: (facet: FacetGroup["facet"], value: string) => boolean;
  readonly onToggle: (facet: FacetGroup["facet"], value: string) => void;
}

/** One value to narrow down by: a tick box as wide as its words, 44 px high, with how many entries it leaves. */
function Option({ group, option, chosen, onToggle }: { readonly group: FacetGroup; readonly option: FacetOption; readonly chosen: boolean; readonly onToggle: () => void }) {
  return (
    <label className="flex min-h-touch cursor-pointer items-center gap-2 border-2 border-rule bg-sheet py-1 pr-3 pl-2 lg:border-transparent lg:bg-transparent hover:bg-[var(--hover)] has-checked:border-bench has-checked:bg-bench has-checked:font-bold has-checked:text-on-bench lg:has-checked:border-bench lg:has-checked:bg-bench has-focus-visible:outline-3 has-focus-visible:outline-offset-3 has-focus-visible:outline-bench">
      <input type="checkbox" name={group.facet} value={option.value} checked={chosen} onChange={onToggle} className="size-5 shrink-0 accent-[var(--bench)]" />
      {group.facet === "colour" ? <WireSwatch letters={option.value} /> : null}
      <span>{option.label}</span>
      <span className="ml-auto pl-1 font-mono">{option.count}<span className="sr-only"> {option.count === 1 ? "entry" : "entries"}</span></span>
    </label>
  );
}

/** The facets: side by side as wide as they need on a phone, one under the other beside the results on a desk. */
export function FacetPanel({ groups, isChosen, onToggle }: FacetPanelProps) {
  return (
    <div className="grid gap-5">
      {groups.filter((group) => group.options.length > 0).map((group) => (
        <fieldset key={group.facet}>
          <legend className="mb-2 text-lg font-bold">{group.title}</legend>
          <div className="flex flex-wrap gap-2 lg:grid lg:grid-cols-1 lg:gap-0 lg:border-t-2 lg:border-rule lg:pt-1">
            {group.options.map((option) => (
              <Option key={option.value} group={group} option={option} chosen={isChosen(group.facet, option.value)} onToggle={() => onToggle(group.facet, option.value)} />
            ))}
          </div>
        </fieldset>
      ))}
    </div>
  );
}
