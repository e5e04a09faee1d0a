/** The only door of the wiring-check engine. Pure: same input, same output, on server and phone. */
export * from "./types";
export { faultId } from "./circuit/candidate";
export { optionalVocabulary, parseCheck, vocabulary } from "./checks";
export { DEFAULT_METER, meterLimit, standardUncertainty } from "./meter";
export { assess } from "./assess";
export { answerRequest, type Answer, type Refusal } from "./answer";
export { carrying, carryingSteps, effects, effectsSteps, evidence, evidenceSteps, explainSteps, drain, predict, tellApart, type Explanation } from "./explain";
export { MOST_AC_VOLTS, MOST_DC_VOLTS } from "./over-limit";
export { faultText, whyText } from "./words";
export { chancesBefore, FINDING_PRIORS, KIND_PRIORS, PRIOR_CHECKS, type Prior } from "./priors";
