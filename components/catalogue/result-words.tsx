import type { SearchResult } from "@/lib/catalogue/search-result";

const entriesWord = (count: number) => (count === 1 ? "1 entry" : `${count} entries`);

const listed = (words: readonly string[]) => words.slice(0, 3).map((word) => `“${word}”`).join(" or ");

/** How many were found, read aloud when it changes. */
export function ResultCount({ result, waiting }: { readonly result: SearchResult; readonly waiting: boolean }) {
  const pages = result.pages > 1 ? `, page ${result.page} of ${result.pages}` : "";
  return <p role="status" className="text-lg font-bold">{waiting ? "Searching …" : `${entriesWord(result.total)}${pages}`}</p>;
}

/** Says when the words were not found as typed, and what stands in for them. */
export function ResultRemarks({ result }: { readonly result: SearchResult }) {
  if (result.total === 0 || (!result.relaxed && result.corrected.length === 0)) return null;
  return (
    <div className="mb-3 bg-straw px-3 py-2 text-on-straw">
      {result.corrected.map(({ typed, used }) => (
        <p key={typed}>{used.length > 0 ? `Nothing has “${typed}”; looked for ${listed(used)}.` : `Nothing has “${typed}”; these come nearest.`}</p>
      ))}
      {result.relaxed ? <p>No entry has all these words; these have most of them.</p> : null}
    </div>
  );
}
