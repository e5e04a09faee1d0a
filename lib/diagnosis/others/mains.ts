import type { CheckSpec, Terminal } from "../types";
import { between, near, word, type Expected } from "./density";
import { grid, wiringExpects, type Order, type OtherFamily } from "./family";

/**
 * Alternating voltage of the mains or of a transformer: one line is live, the other two stand at or near earth. A meter on DC shows
 * about nothing of it, on Hz the mains' 50 or 60 Hz, on duty one half (a sine crosses its mean twice a period). Source: common practice.
 */
const LIVE = 0;
interface Setting { readonly weight: number; readonly hertz: number }
const ORDERS: readonly Order[] = [[1, 2, 3], [2, 1, 3], [3, 1, 2]];

function expects(spec: CheckSpec, line: (t: Terminal) => number, { hertz }: Setting): Expected {
  const live = line(spec.red) === LIVE;
  switch (spec.meter) {
    case "dc-volts": return [near(0.7, 0, 0.05), near(0.28, 0, 0.6)];
    case "ac-volts": return live ? [between(0.98, 10, 260)] : [between(0.9, 0, 5), between(0.08, 5, 260)];
    case "hertz": return live ? [near(0.95, hertz, 0.12), word(0.05, "none")] : [word(0.7, "none"), near(0.28, hertz, 0.12)];
    case "duty": return live ? [near(0.95, 0.5, 0.02), word(0.05, "none")] : [word(0.7, "none"), near(0.28, 0.5, 0.03)];
    case "watch": return [word(0.97, "still"), word(0.03, "jumps")];
    default: return [between(0.6, 0, 60e6), word(0.4, "OL")];
  }
}

export const MAINS: OtherFamily<Setting> = { device: "mains", orders: ORDERS, settings: grid(50, 60).map((hertz) => ({ weight: 1, hertz })), expects: (spec, line, s) => wiringExpects(spec) ?? expects(spec, line, s) };
