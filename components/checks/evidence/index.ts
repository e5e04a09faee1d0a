export { CarryingNote } from "./carrying-note";
export { EvidenceList } from "./evidence-list";
export { TellingList } from "./telling-list";
