import type { Role } from "@/lib/diagnosis";

/** What a pin's tag says, everywhere in the product. */
export const ROLE_TAG: Readonly<Record<Role, string>> = { supply: "+V", ground: "0V", signal: "SIG" };
