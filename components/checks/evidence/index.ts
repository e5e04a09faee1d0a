export { CarryingNote } from "./carrying-note";
export { EvidenceList } from "./evidence-list";
export { MovementMark } from "./movement-mark";
export { TellingList } from "./telling-list";
