import Link from "next/link";
import { paramsOf, type SearchChoice } from "@/lib/catalogue/search-params";

interface ResultPagingProps {
  readonly choice: SearchChoice;
  readonly page: number;
  readonly pages: number;
  readonly onPage: (page: number) => void;
}

/** Earlier and later pages: real addresses, so that they work before the script does. */
export function ResultPaging({ choice, page, pages, onPage }: ResultPagingProps) {
  if (pages <= 1) return null;
  const link = (to: number, label: string) => (
    <Link
      href={`/catalogue?${paramsOf({ ...choice, page: to })}`} prefetch={false} className="tag-cut button button-plain min-h-touch"
      onClick={(event) => {
        if (event.metaKey || event.ctrlKey || event.shiftKey) return;
        event.preventDefault();
        onPage(to);
      }}
    >
      {label}
    </Link>
  );
  return (
    <nav aria-label="Pages of the search" className="mt-5 flex items-center justify-between gap-3">
      {page > 1 ? link(page - 1, "Page before") : <span />}
      <span className="font-mono">{page} / {pages}</span>
      {page < pages ? link(page + 1, "Next page") : <span />}
    </nav>
  );
}
