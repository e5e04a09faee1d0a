import type { Metadata } from "next";
import { CatalogueSearch } from "@/components/catalogue/catalogue-search";
import { PageHeading } from "@/components/ui";
import { requirePermission } from "@/lib/auth/require-permission";
import { searchEntries } from "@/lib/catalogue/search-entries";
import { choiceOf } from "@/lib/catalogue/search-params";

export const metadata: Metadata = { title: "Catalogue" };

type Address = Readonly<Record<string, string | string[] | undefined>>;

function queryOf(address: Address): URLSearchParams {
  const pairs = Object.entries(address).flatMap(([name, value]) => (Array.isArray(value) ? value : value === undefined ? [] : [value]).map((one) => [name, one]));
  return new URLSearchParams(pairs);
}

export default async function CataloguePage({ searchParams }: { readonly searchParams: Promise<Address> }) {
  const person = await requirePermission("catalogue:read");
  const choice = choiceOf(queryOf(await searchParams));
  const result = await searchEntries(person, choice);
  return (
    <>
      <PageHeading title="Catalogue" lead="Devices whose pins are known, and by whom." />
      <CatalogueSearch initial={result} initialChoice={choice} />
    </>
  );
}
