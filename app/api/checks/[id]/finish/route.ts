import { route } from "@/lib/action";
import { finishCheck } from "@/lib/checks/finish-check";

/** Finish the check; the answer holds the verdict. */
export const POST = route<{ id: string }>("check:run", ({ person, params, body }) => finishCheck(person, params.id, body));
