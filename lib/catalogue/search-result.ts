import type { Kind, Role } from "@/lib/diagnosis";

/** What a search gives back; plain data, shared by page, route and browser. */
export interface SearchHit {
  readonly slug: string;
  readonly name: string;
  readonly maker: string;
  readonly partNumbers: readonly string[];
  readonly kind: Kind;
  readonly senses: string;
  readonly connector: string;
  readonly gender: "plug" | "receptacle";
  /** "5 V" or "10–32 V battery". */
  readonly supply: string;
  /** In cavity order. */
  readonly pins: readonly { readonly role: Role; readonly cavity: string; readonly colour: string }[];
}

export interface FacetOption { readonly value: string; readonly label: string; readonly count: number; readonly chosen: boolean }
export interface FacetGroup { readonly facet: "kind" | "quantity" | "connector" | "supply" | "colour"; readonly title: string; readonly options: readonly FacetOption[] }

export interface SearchResult {
  readonly q: string;
  readonly total: number;
  readonly page: number;
  readonly pages: number;
  readonly relaxed: boolean;
  readonly corrected: readonly { readonly typed: string; readonly used: readonly string[] }[];
  readonly hits: readonly SearchHit[];
  readonly facets: readonly FacetGroup[];
}
