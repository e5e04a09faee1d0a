import { route } from "@/lib/action";
import { getCheck } from "@/lib/checks/get-check";

/** One check with its setup, steps, verdict and what it was recorded to have been. */
export const GET = route<{ id: string }>("check:read", ({ person, params }) => getCheck(person, params.id));
