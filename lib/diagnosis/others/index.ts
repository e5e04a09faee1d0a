import { exp, ln } from "../numerics";
import type { Observation } from "../inference/observe";
import { OTHER_PRIORS } from "../priors";
import type { OtherChance, OtherDevice } from "../types";
import { CAN_PAIR } from "./can-pair";
import { CURRENT_LOOP } from "./current-loop";
import { EDGE_PROTOCOL } from "./edge-protocol";
import { logEvidence } from "./family";
import { MAINS } from "./mains";
import { SWITCH_NPN, SWITCH_PNP } from "./switch";

/** A device this far (in natural-log units) behind the three kinds is given up: less than one in three million. */
const FAR_BEHIND = 15;

/** Log-evidence of each device that is not one of the three kinds, the chance before the first reading left out. */
const EVIDENCE: Readonly<Record<OtherDevice, (obs: readonly Observation[], least: number) => number>> = {
  "current-loop": (obs, least) => logEvidence(CURRENT_LOOP, obs, least), "switch-pnp": (obs, least) => logEvidence(SWITCH_PNP, obs, least), "switch-npn": (obs, least) => logEvidence(SWITCH_NPN, obs, least),
  "edge-protocol": (obs, least) => logEvidence(EDGE_PROTOCOL, obs, least), "can-pair": (obs, least) => logEvidence(CAN_PAIR, obs, least), mains: (obs, least) => logEvidence(MAINS, obs, least),
};

/**
 * Chances of the devices that are not one of the three kinds, likeliest first; with the chance of the three kinds they sum to 1.
 * `logThree` is the log-weight of the three kinds together; `share` the chance that another device than the entry's is fitted (1 without one).
 */
export function othersBeside(logThree: number, obs: readonly Observation[], share: number): OtherChance[] {
  const logs = OTHER_PRIORS.map(({ code, share: before }) => {
    const prior = ln(before * share);
    return { device: code, log: prior + EVIDENCE[code](obs, logThree - prior - FAR_BEHIND) };
  });
  const most = logs.reduce((m, { log }) => Math.max(m, log), logThree);
  const total = logs.reduce((sum, { log }) => sum + exp(log - most), exp(logThree - most));
  return logs.map(({ device, log }) => ({ device, p: exp(log - most) / total })).sort((a, b) => b.p - a.p || (a.device < b.device ? -1 : 1));
}
