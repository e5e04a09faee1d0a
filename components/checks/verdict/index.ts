export { VerdictView } from "./verdict-view";
export { EvidenceTable } from "./evidence-table";
export { PinsTable } from "./pins-table";
export { WiringSketch } from "./wiring-sketch";
