export { OutcomeBoard } from "./outcome-board";
export { OutcomeLine } from "./outcome-line";
export { outcomeGroups, type OutcomeGroup } from "./outcome-options";
export { againstVerdict, OutcomeWords } from "./outcome-words";
export { WithdrawForm } from "./withdraw-form";
