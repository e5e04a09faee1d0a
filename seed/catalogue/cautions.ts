/** Cautions that entries share; each says what can hurt and what to do first. */
export const CAUTIONS = {
  ladder: "The bucket ladder drops when its winch lets go. Lower it onto its rests before anyone works under it.",
  boom: "The boom may drop when the controller loses this signal. Lower it or block it before you part the connector.",
  winch: "The drum can turn when power returns. Unload the rope and lock out the winch drive before anyone reaches in.",
  paddle: "The paddle may move without warning when power returns. Lock out the drive and keep hands off the rack.",
  hitch: "The hitch can drop or lift when its position is lost. Lower the implement to the ground first.",
  engine: "The engine may change speed while you move this control. Take it out of gear and keep clear of the shaft and the screw.",
  pressure: "Hydraulic pressure stays stored after the pump stops. Relieve it before you undo the sensor; the electrical checks need no fitting undone.",
  tank: "Vapour may stand above the liquid. Make no electrical check at the open tank without a gas test by a licensed person.",
  slew: "The upper part may slew when the controller wakes. Engage the slewing lock first.",
  rudder: "The rudder may be driven hard over when the signal returns. Keep clear of the tiller arm.",
  load: "The rope is under load whenever this sensor reads more than slack. Unload it before you work beside it.",
  fiveVolts: "Supplied with 5 V by the controller. Battery voltage on the supply pin destroys it.",
  eightVolts: "The 8 V supply of the controller gives few milliamps. Put nothing but a meter on it.",
  wiper: "The wiper carries no load current. Measure its volts, never draw current from it.",
  pullUp: "Open-collector output: without the controller's pull-up it shows no signal and is not therefore at fault.",
  pulses: "On ohms this device looks dead, because there is electronics between its pins. Check it powered.",
  water: "Stands in water. Let the connector dry before you judge insulation.",
} as const;

export type CautionKey = keyof typeof CAUTIONS;
