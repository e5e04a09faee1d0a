import { route } from "@/lib/action";
import { confirmCheck } from "@/lib/checks/confirm-check";

/** Record what a finished check turned out to be. */
export const POST = route<{ id: string }>("check:confirm", ({ person, params, body }) => confirmCheck(person, params.id, body));
