/** Numbers with units as people type and read them, wires and their colours. Pure; no import from the rest of the project. */
export { parseQuantity, type ParsedQuantity } from "./parse";
export { formatQuantity, type FormatOptions } from "./format";
export type { Refusal, RefusalCode } from "./refuse";
export { MEASURED_UNITS, type MeasuredUnit, type Unit } from "./units";
export { IEC_COLOURS, colourWords, dinColour, parseColour, type ParsedColour } from "./colours";
export { awgAreaMm2, awgDiameterMm, copperFactor, iec60228Factor, largestOhmsPerMetre, wireOhms } from "./wire";
export { DOMINANT_RECTANGULAR_K, combinedUncertainty, limitOfError, standardUncertainty, type Contribution, type DisplayLimit, type Shape } from "./uncertainty";
