export { CheckFacts } from "./check-facts";
export { EvidenceTable } from "./evidence-table";
export { PinsTable } from "./pins-table";
export { AttachMachine, VerdictButtons } from "./verdict-buttons";
export { VerdictView } from "./verdict-view";
export { WiringSketch } from "./wiring-sketch";
