import { colourWords, IEC_COLOURS } from "@/lib/units";
import { KINDS } from "@/lib/diagnosis";
import { FACETS, type Facet, type SearchInput } from "./schemas";
import type { FacetGroup } from "./search-result";
import type { SearchRow } from "./search-rows";
import { KIND_NAMES } from "./kind-names";

const TITLES: Readonly<Record<Facet, string>> = { kind: "Kind", quantity: "Senses", connector: "Connector", supply: "Supply", colour: "Wire colour" };

function valuesOf(row: SearchRow, facet: Facet): readonly string[] {
  if (facet === "colour") return [...new Set(row.colours.split("/"))];
  return [row[facet]];
}

function labelOf(facet: Facet, value: string): string {
  if (facet === "kind") return KINDS.map((kind) => (kind === value ? KIND_NAMES[kind] : "")).join("") || value;
  if (facet === "supply") return value === "battery" ? "Battery voltage" : `${value}\u00a0V`;
  if (facet === "colour") return `${value} ${colourWords(value) ?? ""}`.trim();
  return value;
}

/** Kinds and colours in their own order, volts by size, everything else by its name. */
function orderOf(facet: Facet, value: string): number {
  if (facet === "kind") return KINDS.findIndex((kind) => kind === value);
  if (facet === "colour") return value.length * 100 + IEC_COLOURS.findIndex(([code]) => code === value.slice(0, 2));
  return facet === "supply" ? (value === "battery" ? 1e6 : Number(value)) : 0;
}

type Chosen = Pick<SearchInput, Facet>;

function fits(row: SearchRow, chosen: Chosen, except?: Facet): boolean {
  return FACETS.every((facet) => facet === except || chosen[facet].length === 0 || valuesOf(row, facet).some((value) => chosen[facet].includes(value)));
}

/** Rows that have, of each facet with a choice, at least one of the values chosen. */
export function filterRows(rows: readonly SearchRow[], chosen: Chosen): readonly SearchRow[] {
  return rows.filter((row) => fits(row, chosen));
}

/** Every facet's values with how many entries each would leave, the other facets' choices kept; a chosen value stays listed at 0. */
export function facetGroups(rows: readonly SearchRow[], chosen: Chosen): readonly FacetGroup[] {
  return FACETS.map((facet) => {
    const counts = new Map<string, number>(chosen[facet].map((value) => [value, 0]));
    for (const row of rows) {
      if (!fits(row, chosen, facet)) continue;
      for (const value of valuesOf(row, facet)) counts.set(value, (counts.get(value) ?? 0) + 1);
    }
    const options = [...counts]
      .map(([value, count]) => ({ value, label: labelOf(facet, value), count, chosen: chosen[facet].includes(value) }))
      .sort((a, b) => orderOf(facet, a.value) - orderOf(facet, b.value) || a.label.localeCompare(b.label, "en"));
    return { facet, title: TITLES[facet], options };
  });
}
