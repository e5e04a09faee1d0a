import { route } from "@/lib/action";
import { attachMachine } from "@/lib/checks/attach-machine";

/** Say on which machine a finished check was made. */
export const POST = route<{ id: string }>("check:run", ({ person, params, body }) => attachMachine(person, params.id, body));
