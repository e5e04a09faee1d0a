import type { Metadata, Route } from "next";
import { LogFilters, activeFilters, type LogQuery } from "@/components/checks/log/log-filters";
import { LogList } from "@/components/checks/log/log-list";
import { ButtonLink, EmptyState, Notice, PageHeading } from "@/components/ui";
import { hasPermission, type Person } from "@/lib/auth/permissions";
import { requirePermission } from "@/lib/auth/require-permission";
import type { CheckPage } from "@/lib/checks/check-view";
import { listChecks } from "@/lib/checks/list-checks";
import { logChoices } from "@/lib/checks/log-choices";
import { AppError } from "@/lib/errors";

export const metadata: Metadata = { title: "Checks" };

const KEYS = ["machine", "entry", "person", "kind", "finding", "state", "from", "to", "after"] as const;

type Params = Readonly<Record<string, string | string[] | undefined>>;

/** Only what the log knows, one value each. */
function queryOf(params: Params): LogQuery {
  return Object.fromEntries(KEYS.flatMap((key) => {
    const value = [params[key]].flat()[0];
    return value ? [[key, value]] : [];
  }));
}

/** A filter that cannot be read is said so on the page; anything else is not for here. */
async function load(person: Person, query: LogQuery): Promise<CheckPage | AppError> {
  try {
    return await listChecks(person, query);
  } catch (error) {
    if (error instanceof AppError && error.status === 400) return error;
    throw error;
  }
}

/** The same filters at another place in the log; the newest page has none. */
function addressOf(query: LogQuery, after: string | null): Route {
  const filters = Object.entries(query).filter(([key]) => key !== "after");
  const text = new URLSearchParams(after ? [...filters, ["after", after]] : filters).toString();
  return `/checks${text ? `?${text}` : ""}` as Route;
}

function Pages({ query, next }: { readonly query: LogQuery; readonly next: string | null }) {
  if (!query.after && !next) return null;
  return (
    <nav aria-label="Pages of the log" className="mt-4 flex flex-wrap gap-3">
      {query.after ? <ButtonLink href={addressOf(query, null)}>Back to the newest</ButtonLink> : null}
      {next ? <ButtonLink href={addressOf(query, next)}>Older checks</ButtonLink> : null}
    </nav>
  );
}

function StartButton() {
  return <ButtonLink href={"/checks/new" as Route} tone="main">Start a check</ButtonLink>;
}

function Nothing({ query, mayRun }: { readonly query: LogQuery; readonly mayRun: boolean }) {
  if (activeFilters(query) > 0) {
    return <EmptyState title="No check fits these filters" action={<ButtonLink href="/checks">Clear filters</ButtonLink>}>Take one off, or widen the days.</EmptyState>;
  }
  return (
    <EmptyState title="No check has been made yet" action={mayRun ? <StartButton /> : undefined}>
      Every finished check of the workshop stands here, and your own running ones.
    </EmptyState>
  );
}

/** The log of checks; its filters are in the address. */
export default async function ChecksPage({ searchParams }: { readonly searchParams: Promise<Params> }) {
  const person = await requirePermission("check:read");
  const query = queryOf(await searchParams);
  const [page, choices] = await Promise.all([load(person, query), logChoices(person)]);
  const mayRun = hasPermission(person, "check:run");
  return (
    <>
      <PageHeading title="Checks" lead="Every finished check of the workshop, and your own running ones." actions={<><ButtonLink href="/checks/chances">Chances before the first reading</ButtonLink>{mayRun ? <StartButton /> : null}</>} />
      <LogFilters query={query} choices={choices} open={page instanceof AppError} />
      <div className="mt-6">
        {page instanceof AppError
          ? <Notice tone="stop" title="These filters cannot be read"><p>{page.message}</p></Notice>
          : page.rows.length === 0 ? <Nothing query={query} mayRun={mayRun} /> : <><LogList rows={page.rows} /><Pages query={query} next={page.next} /></>}
      </div>
    </>
  );
}
