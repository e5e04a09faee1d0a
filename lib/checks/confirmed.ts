import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import { checks, confirmations } from "@/db/schema";
import type { FaultCode, PinNumber } from "@/lib/diagnosis";
import { findingHeading } from "./finding-words";
import type { RunSetup } from "./run";

/** Joins a check with its confirmation in force; the database allows one at most. */
export const inForce = and(eq(confirmations.checkId, checks.id), isNull(confirmations.withdrawnAt));

/** What a list needs of it to say what a check turned out to be. */
export const CONFIRMED_COLUMNS = { setup: checks.setup, confirmedCode: confirmations.findingCode, confirmedPins: confirmations.findingPins } as const;

interface Joined { readonly setup: Pick<RunSetup, "cavityLabels">; readonly confirmedCode: FaultCode | null; readonly confirmedPins: readonly PinNumber[] | null }

/** What the check turned out to be, with its place, e.g. "Wire to B open"; null while nothing is confirmed. */
export function confirmedWords({ setup, confirmedCode, confirmedPins }: Joined): string | null {
  return confirmedCode && findingHeading({ code: confirmedCode, ...(confirmedPins ? { pins: confirmedPins } : {}) }, setup.cavityLabels);
}
