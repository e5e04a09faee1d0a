/** Numbers with units as people type and read them. Pure; no import from the rest of the project. */
export { parseQuantity, type ParsedQuantity } from "./parse";
export { formatQuantity, type FormatOptions } from "./format";
export type { Refusal, RefusalCode } from "./refuse";
export { MEASURED_UNITS, type MeasuredUnit, type Unit } from "./units";
