/** What is on the screen but not yet a step: kept at every key press, so that a reload shows the same screen. */
export interface Draft {
  /** Check picked out of turn or being taken again; null: the engine's choice. */
  readonly chosen: string | null;
  /** Text in the field and the check it belongs to. */
  readonly typed: { readonly check: string; readonly text: string; readonly unit: string } | null;
  /** The technician wants more readings although enough is known. */
  readonly carryOn: boolean;
}

export const EMPTY_DRAFT: Draft = { chosen: null, typed: null, carryOn: false };

const keyOf = (personId: string, runId: string): string => `pinwright:draft:${personId}:${runId}`;

function isDraft(value: unknown): value is Draft {
  if (typeof value !== "object" || value === null) return false;
  const { chosen, typed, carryOn } = value as Record<string, unknown>;
  const typedOk = typed === null || (typeof typed === "object" && ["check", "text", "unit"].every((key) => typeof (typed as Record<string, unknown>)[key] === "string"));
  return (chosen === null || typeof chosen === "string") && typedOk && typeof carryOn === "boolean";
}

/** The draft of a run, or an empty one when there is none or it cannot be read. */
export function loadDraft(storage: Pick<Storage, "getItem">, personId: string, runId: string): Draft {
  try {
    const value: unknown = JSON.parse(storage.getItem(keyOf(personId, runId)) ?? "null");
    return isDraft(value) ? value : EMPTY_DRAFT;
  } catch {
    return EMPTY_DRAFT;
  }
}

/** Keeps the draft. Storage that is full or blocked loses only the draft, so that is no reason to stop the check. */
export function saveDraft(storage: Pick<Storage, "setItem">, personId: string, runId: string, draft: Draft): void {
  try {
    storage.setItem(keyOf(personId, runId), JSON.stringify(draft));
  } catch {
    return;
  }
}
