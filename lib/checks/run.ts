import type { ConnectorShape } from "@/lib/catalogue/entry-data";
import type { Expect, Experience, MeterSpec, ReadingValue } from "@/lib/diagnosis";

/** Why a reading could not be taken; shown as choices, kept in the record. */
export const SKIP_REASONS = ["cannot-reach", "not-safe-here", "no-function-on-meter", "cannot-part-connector", "cannot-move-actuator", "other"] as const;
export type SkipReason = (typeof SKIP_REASONS)[number];

/** What can be seen before the first reading; every part optional but the three labels. */
export interface RunSetup {
  readonly cavityLabels: readonly [string, string, string];
  readonly expect?: Expect;
  readonly entryId?: string;
  readonly entryVersionId?: string;
  readonly machineId?: string;
  readonly machineName?: string;
  readonly entryName?: string;
  readonly meterId?: string;
  /** Limits of the meter as they were at the start: the phone computes with them, and so must the server. */
  readonly meter?: MeterSpec;
  /** The connector's face with the labels of this device: from the entry, or picked by drawing. */
  readonly connector?: ConnectorShape;
  readonly wireColours?: readonly [string | null, string | null, string | null];
  readonly senses?: string;
  readonly batteryVolts?: number;
  readonly recheckOf?: string;
  /** The workshop's own confirmed checks as they were counted at the start, so that an old check never changes. */
  readonly experience?: Experience;
  readonly note?: string;
}

/**
 * A run is an append-only list of steps with ids made on the phone (ULID): sending one twice does no harm,
 * and undo is a step of its own, so nothing typed is ever lost.
 */
export type RunStep = { readonly id: string; readonly at: string } & (
  | { readonly type: "reading"; readonly check: string; readonly value: ReadingValue; readonly typed: string }
  | { readonly type: "skip"; readonly check: string; readonly reason: SkipReason; readonly note?: string }
  | { readonly type: "state"; readonly deviceParted: boolean; readonly controllerParted: boolean; readonly powerOn: boolean }
  | { readonly type: "retract"; readonly step: string }
);

export interface Run { readonly id: string; readonly setup: RunSetup; readonly steps: readonly RunStep[] }

