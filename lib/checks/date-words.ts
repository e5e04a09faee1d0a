const DATE = new Intl.DateTimeFormat("en-GB", { day: "numeric", month: "short", year: "numeric", timeZone: "UTC" });
const TIME = new Intl.DateTimeFormat("en-GB", { hour: "2-digit", minute: "2-digit", timeZone: "UTC" });

/** A day for lists and reports, e.g. "3 Mar 2026". Times are kept and shown in UTC, so that no two people read them differently. */
export function dayWords(iso: string): string {
  return DATE.format(new Date(iso));
}

/** A moment, e.g. "3 Mar 2026, 09:14 UTC". */
export function momentWords(iso: string): string {
  return `${dayWords(iso)}, ${TIME.format(new Date(iso))} UTC`;
}
