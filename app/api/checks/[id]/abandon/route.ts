import { route } from "@/lib/action";
import { abandonCheck } from "@/lib/checks/abandon-check";

/** Give up a running check; its steps stay on record. */
export const POST = route<{ id: string }>("check:run", ({ person, params }) => abandonCheck(person, params.id));
