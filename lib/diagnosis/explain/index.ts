/** What the readings say and why, in numbers; the words are made from them elsewhere. The door of this folder. */
export { carrying, carryingSteps } from "./carrying";
export { effects, effectsSteps } from "./effects";
export { evidence, evidenceSteps, predict } from "./evidence";
export { explainSteps, type Explanation } from "./explanation";
export { drain } from "./leaving-out";
export { tellApart } from "./tell-apart";
