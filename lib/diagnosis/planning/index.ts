/** Choice of the next test, knowing nothing of what is tested. Pure and deterministic. */
export { planNext, rankTests } from "./plan";
export { optimalCost, policyCost, type StrategyCost } from "./exact";
export { entropyBits } from "./gain";
export { entropyBound, huffmanLength } from "./bounds";
export type { PlannedTest, PlanOptions, PlanProblem, PlanTest } from "./types";
