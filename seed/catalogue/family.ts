import type { Kind, Role } from "@/lib/diagnosis";
import type { HealthyReadings } from "@/lib/catalogue/entry-data";
import type { CautionKey } from "./cautions";

/** How the value follows the signal's travel from rest (0) to full (1). */
export type Curve = "straight" | "lever" | "late" | "lying-tank" | "drum";

export interface Variant {
  readonly name: string;
  /** Maker's numbers, the current one first. */
  readonly parts: readonly string[];
  /** Engineering value at rest and at full travel. */
  readonly values: readonly [rest: number, full: number];
  readonly healthy?: HealthyReadings;
  readonly connector?: string;
  readonly points?: number;
  readonly gaugeMm2?: number;
}

/** One series of one maker: what its variants share. */
export interface Family {
  readonly maker: string;
  readonly kind: Kind;
  readonly senses: string;
  readonly movement: string;
  /** Volts of a fixed supply, or lowest and highest battery volts. */
  readonly supply: number | readonly [number, number];
  readonly connector: string;
  /** Roles of the cavities in the order of their labels, null where a cavity is not used. */
  readonly order: readonly (Role | null)[];
  readonly colours: Readonly<Record<Role, string>>;
  readonly gaugeMm2: number;
  readonly healthy: HealthyReadings;
  readonly value: { readonly name: string; readonly unit: string; /** Smallest step written down. */ readonly step: number };
  readonly curve: Curve;
  readonly points: number;
  readonly cautions: readonly CautionKey[];
  /** Number and date of the measurement sheet; the data sheet's issue month. */
  readonly sheet: readonly [number: number, date: string];
  readonly dataSheet: readonly [reference: string, date: string];
  readonly variants: readonly Variant[];
}
