import "server-only";
import { notFound } from "next/navigation";
import type { Person } from "@/lib/auth/permissions";
import type { CheckView } from "@/lib/checks/check-view";
import { getCheck } from "@/lib/checks/get-check";
import { AppError } from "@/lib/errors";

/** A check for a page that cannot do without it: the not-found page where it is not this person's to see. */
export async function checkForPage(person: Person, id: string): Promise<CheckView> {
  try {
    return await getCheck(person, id);
  } catch (error) {
    if (error instanceof AppError && error.status === 404) notFound();
    throw error;
  }
}
