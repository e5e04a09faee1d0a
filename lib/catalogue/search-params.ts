import type { FacetGroup } from "./search-result";

/** Facets in the order in which they are shown; the same names in the address and in `searchEntriesSchema`. */
export const FACET_NAMES: readonly FacetGroup["facet"][] = ["kind", "quantity", "connector", "supply", "colour"];

export type SearchChoice = { readonly q: string; readonly page: number } & Readonly<Record<FacetGroup["facet"], readonly string[]>>;

/** The raw input of a search from an address: text only, not yet checked; repeated facets are gathered. */
export function searchInputOf(query: URLSearchParams): Record<string, unknown> {
  const known = new Set<string>(["q", "page", ...FACET_NAMES]);
  const unknown = [...query.keys()].filter((name) => !known.has(name));
  return {
    ...Object.fromEntries(unknown.map((name) => [name, query.get(name)])),
    ...(query.has("q") && { q: query.get("q") }),
    ...(query.has("page") && { page: query.get("page") }),
    ...Object.fromEntries(FACET_NAMES.filter((name) => query.has(name)).map((name) => [name, query.getAll(name)])),
  };
}

/** What an address chooses, as far as it can be read; anything odd in a typed address is left out. */
export function choiceOf(query: URLSearchParams): SearchChoice {
  const page = Number(query.get("page") ?? 1);
  const facet = (name: FacetGroup["facet"]) => query.getAll(name).filter((value) => value.length > 0 && value.length <= 80).slice(0, 20);
  return {
    q: (query.get("q") ?? "").slice(0, 200), page: Number.isInteger(page) && page >= 1 && page <= 1000 ? page : 1,
    kind: facet("kind"), quantity: facet("quantity"), connector: facet("connector"), supply: facet("supply"), colour: facet("colour"),
  };
}

/** The shortest address that says the same; always in the same order, so that it serves as a cache key. */
export function paramsOf(choice: SearchChoice): URLSearchParams {
  const params = new URLSearchParams();
  if (choice.q.trim() !== "") params.set("q", choice.q);
  for (const name of FACET_NAMES) for (const value of choice[name]) params.append(name, value);
  if (choice.page > 1) params.set("page", String(choice.page));
  return params;
}

/** The choice with one facet value put in or taken out; back to the first page. */
export function toggled(choice: SearchChoice, facet: FacetGroup["facet"], value: string): SearchChoice {
  const values = choice[facet].includes(value) ? choice[facet].filter((other) => other !== value) : [...choice[facet], value];
  return { ...choice, [facet]: values, page: 1 };
}

/** How many facet values are chosen. */
export function chosenCount(choice: SearchChoice): number {
  return FACET_NAMES.reduce((sum, name) => sum + choice[name].length, 0);
}
