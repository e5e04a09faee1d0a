import type { MachineState } from "@/lib/diagnosis";

export type StateAction =
  | "power-off" | "part-device" | "part-controller" | "mate-controller" | "mate-device" | "power-on";

/** A machine's state with nothing left open. */
export interface SettledState { readonly deviceParted: boolean; readonly controllerParted: boolean; readonly powerOn: boolean }

export interface Transition {
  /** What to do, in the order in which it is safe to do it; never empty. */
  readonly actions: readonly StateAction[];
  readonly end: SettledState;
}

/** What the connector should be: as needed, else as it is, else mated as machines are found. */
function settle(needed: boolean | null, known: boolean | null): boolean {
  return needed ?? known ?? false;
}

/**
 * The way from what is known of the machine to what a check needs, or null when the machine is there already.
 * Connectors are parted and mated only with the power off, and power comes on last. Unknown counts as "not there".
 */
export function transition(known: MachineState, needed: MachineState): Transition | null {
  if (needed.deviceParted === null && needed.controllerParted === null && needed.powerOn === null) return null;
  const deviceParted = settle(needed.deviceParted, known.deviceParted);
  const controllerParted = settle(needed.controllerParted, known.controllerParted);
  const deviceMoves = known.deviceParted !== deviceParted;
  const controllerMoves = known.controllerParted !== controllerParted;
  const moves = deviceMoves || controllerMoves;
  const powerOn = needed.powerOn ?? (moves ? false : known.powerOn ?? false);

  const actions: StateAction[] = [];
  if (known.powerOn !== false && (moves || !powerOn)) actions.push("power-off");
  if (deviceMoves && deviceParted) actions.push("part-device");
  if (controllerMoves) actions.push(controllerParted ? "part-controller" : "mate-controller");
  if (deviceMoves && !deviceParted) actions.push("mate-device");
  if (powerOn && (known.powerOn !== true || moves)) actions.push("power-on");
  // Power already off and confirmed, nothing to move: the machine is as the check needs it.
  const there = !moves && known.powerOn === powerOn;
  return there ? null : { actions, end: { deviceParted, controllerParted, powerOn } };
}
