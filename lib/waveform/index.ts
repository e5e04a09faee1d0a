/** Pulse trains: state levels, period, duty, mean and rms. Pure; no import from the rest of the project. */
export { referenceLevels, stateLevels, type ReferenceLevels, type StateLevels } from "./levels";
export { dutyFromMean, measurePulses, pulseAcRms, pulseMean, pulseRms, pulseWidth, type PulseMeasure } from "./pulse";
