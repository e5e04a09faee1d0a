import type { EvidenceRow } from "@/lib/diagnosis";
import type { Verdict } from "./verdict";

type Kept<T, New extends keyof T> = Omit<T, New> & Partial<Pick<T, New>>;
type KeptRow = Kept<EvidenceRow, "offLimits" | "offIfSound" | "factor" | "without">;

/** A verdict as some version of ours stored it: version 1 kept neither distances, nor factors, nor what carries it; 1 and 2 knew the three kinds alone, and kept not what tells them apart. */
export type StoredVerdict = Omit<Kept<Verdict, "explained" | "carrying" | "others" | "refusal" | "tellKindsApart">, "evidence"> & { readonly evidence: readonly KeptRow[] };

const rowOf = (row: KeptRow): EvidenceRow => ({ ...row, offLimits: row.offLimits ?? null, offIfSound: row.offIfSound ?? null, factor: row.factor ?? null, without: row.without ?? null });

/** Reads a stored verdict. What an older version did not keep is unknown, not worked out anew: it would be another version's word. */
export function readVerdict(stored: StoredVerdict | null): Verdict | null {
  if (!stored) return null;
  const evidence = stored.evidence.map(rowOf);
  const explained = stored.explained ?? [{ finding: stored.evidenceFinding ?? { code: "none" as const }, rows: evidence }];
  return { ...stored, evidence, carrying: stored.carrying ?? null, explained, others: stored.others ?? [], refusal: stored.refusal ?? null, tellKindsApart: stored.tellKindsApart ?? null };
}
