import type { ReactNode } from "react";

interface PageHeadingProps {
  readonly title: ReactNode;
  readonly lead?: ReactNode;
  /** Buttons or links that belong to the whole page. */
  readonly actions?: ReactNode;
}

/** The one h1 of a page. */
export function PageHeading({ title, lead, actions }: PageHeadingProps) {
  return (
    <header className="mb-6 flex flex-wrap items-end justify-between gap-4">
      <div className="min-w-0 max-w-prose">
        <h1 className="text-3xl leading-tight font-bold sm:text-4xl">{title}</h1>
        {lead ? <p className="mt-2 text-lg text-quiet">{lead}</p> : null}
      </div>
      {actions ? <div className="flex flex-wrap gap-3 print:hidden">{actions}</div> : null}
    </header>
  );
}
