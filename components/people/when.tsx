const FORMAT = new Intl.DateTimeFormat("en-GB", { dateStyle: "medium", timeStyle: "short", timeZone: "UTC" });

/** A moment as stored, in UTC and saying so, the same on server and phone. */
export function When({ at }: { readonly at: Date }) {
  return <time dateTime={at.toISOString()} className="whitespace-nowrap">{FORMAT.format(at)} UTC</time>;
}
