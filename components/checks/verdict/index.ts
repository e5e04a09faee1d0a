export { CheckFacts } from "./check-facts";
export { ApartSection, type Apart } from "./apart-section";
export { PinsTable } from "./pins-table";
export { AttachMachine, VerdictButtons } from "./verdict-buttons";
export { VerdictView } from "./verdict-view";
export { WiringSketch } from "./wiring-sketch";
