import type { EntryData } from "./entry-data";
import { coloursFacet, searchTextOf, supplyFacet } from "./words";

/** The columns of a version that are copied out of its data: one place, so that they never disagree with it. */
export function versionColumns(data: EntryData) {
  return {
    name: data.name, kind: data.kind, maker: data.maker, quantity: data.senses, connectorShape: data.connector.name,
    supply: supplyFacet(data), colours: coloursFacet(data), searchText: searchTextOf(data), data,
  };
}
