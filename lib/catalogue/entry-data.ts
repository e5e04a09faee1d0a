import type { Kind, Role } from "@/lib/diagnosis";

/** One contact cavity of a connector face, as seen from the mating side. */
export interface Cavity {
  readonly label: string;
  /** Grid place: rows from the top, columns from the left, in pitches; fractions are offsets. */
  readonly row: number;
  readonly column: number;
}

/**
 * A moulding that stops wrong mating. `at` is its middle as a share of the side (0 left or top, 1 right or bottom; on a
 * round face the share of that quarter of the rim, counted the same way); `width` is in pitches.
 */
export interface Keying {
  readonly side: "top" | "right" | "bottom" | "left";
  readonly at: number;
  readonly width: number;
  readonly type: "rib" | "slot";
}

/** A connector's face as data: drawn, never photographed. Cavities stand in the order of their labels. */
export interface ConnectorShape {
  readonly id: string;
  readonly name: string;
  readonly outline: "rectangle" | "rounded" | "round" | "triangle";
  readonly cavities: readonly Cavity[];
  readonly keying: readonly Keying[];
  readonly latch: "top" | "bottom" | "left" | "right" | "none";
  readonly gender: "plug" | "receptacle";
}

export interface EntryPin {
  readonly role: Role;
  /** Cavity label in the connector. */
  readonly cavity: string;
  /** IEC 60757 letters, e.g. "BK", "GNYE". */
  readonly colour: string;
  readonly gaugeMm2: number;
}

/** A span of a healthy signal: value with the actuator at rest and at full travel. */
export interface RestFull { readonly rest: number; readonly full: number }

export interface HealthyReadings {
  readonly totalOhms?: number;
  readonly tolerancePercent?: number;
  readonly wiperSeriesOhms?: number;
  readonly signalRatio?: RestFull;
  readonly signalVolts?: RestFull;
  readonly duty?: RestFull;
  readonly frequencyHz?: number;
  readonly output?: "open-collector" | "push-pull";
  readonly pullUpNeeded?: boolean;
}

export interface TransferTable {
  readonly signal: { readonly name: string; readonly unit: string };
  readonly value: { readonly name: string; readonly unit: string };
  /** Strictly monotonic in `signal`; interpolated linearly between points. */
  readonly points: readonly { readonly signal: number; readonly value: number }[];
}

/** The whole content of one published version of an entry. */
export interface EntryData {
  readonly name: string;
  readonly maker: string;
  readonly partNumbers: readonly string[];
  readonly kind: Kind;
  readonly senses: string;
  readonly movement: string;
  readonly supply: { readonly type: "fixed"; readonly volts: number } | { readonly type: "battery"; readonly minVolts: number; readonly maxVolts: number };
  readonly pins: readonly EntryPin[];
  readonly connector: ConnectorShape;
  readonly healthy: HealthyReadings;
  readonly transfer: TransferTable;
  readonly cautions: readonly string[];
  readonly sources: readonly { readonly title: string; readonly reference: string; readonly date: string }[];
}
