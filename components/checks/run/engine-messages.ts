import type { Assessment, Reading, ReadingEffect, Setup } from "@/lib/diagnosis";

export interface EngineRequest { readonly id: number; readonly task: "assess" | "effects"; readonly setup: Setup; readonly readings: readonly Reading[] }

export type EngineAnswer =
  | { readonly id: number; readonly task: "assess"; readonly assessment: Assessment }
  | { readonly id: number; readonly task: "effects"; readonly effects: readonly ReadingEffect[] }
  | { readonly id: number; readonly task: "failed"; readonly message: string };
