import { route } from "@/lib/action";
import { listChecks } from "@/lib/checks/list-checks";
import { startCheck } from "@/lib/checks/start-check";

/** The log, filtered and paged by the query. */
export const GET = route("check:read", ({ person, query }) => listChecks(person, Object.fromEntries(query)));

/** Start a check under an id made by the sender. */
export const POST = route("check:run", ({ person, body }) => startCheck(person, body));
