import { route } from "@/lib/action";
import { startRecheck } from "@/lib/checks/start-recheck";

/** Start a linked check after a repair, under an id made by the sender. */
export const POST = route<{ id: string }>("check:run", ({ person, params, body }) => startRecheck(person, params.id, body));
