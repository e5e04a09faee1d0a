import { route } from "@/lib/action";
import { withdrawConfirmation } from "@/lib/checks/withdraw-confirmation";

/** Take a confirmation back; it stays on record. */
export const POST = route<{ id: string }>("check:confirm", ({ person, params }) => withdrawConfirmation(person, { confirmationId: params.id }));
