import { route } from "@/lib/action";
import { appendSteps } from "@/lib/checks/append-steps";

/** Append steps; sending the same ones again does no harm, so PUT and POST mean the same. */
const append = route<{ id: string }>("check:run", ({ person, params, body }) => appendSteps(person, params.id, body));

export { append as POST, append as PUT };
