import type { Family } from "./family";

/** Powered pulse-width devices, first half. */
export const PWM_A: readonly Family[] = [
  {
    maker: "Corvane Controls", kind: "pwm", senses: "Lever position", movement: "Hand lever, 60 degrees, contactless",
    supply: 8, connector: "inline-3-letters-plug", order: ["supply", "ground", "signal"], colours: { supply: "BN", ground: "BU", signal: "BK" }, gaugeMm2: 0.75,
    healthy: { output: "open-collector", pullUpNeeded: true, frequencyHz: 500, duty: { rest: 0.16, full: 0.82 } },
    value: { name: "Engine speed asked for", unit: "rpm", step: 5 }, curve: "straight", points: 4, cautions: ["engine", "pullUp", "pulses", "eightVolts"],
    sheet: [55, "2024-10-02"], dataSheet: ["CV-61 levers, issue 2", "2021-03-01"],
    variants: [
      { name: "Throttle lever, weed-cutting boat", parts: ["CV-61.04-R", "CV-60.04-R"], values: [750, 2400] },
      { name: "Throttle lever, dredger pump", parts: ["CV-61.07-R"], values: [600, 1900], healthy: { duty: { rest: 0.12, full: 0.88 } } },
      { name: "Throttle lever, winch tug", parts: ["CV-61.11-L"], values: [700, 2200], healthy: { frequencyHz: 250 } },
      { name: "Ahead-astern lever", parts: ["CV-62.02-N"], values: [-100, 100], healthy: { duty: { rest: 0.1, full: 0.9 } }, points: 5 },
    ],
  },
  {
    maker: "Dunlarch Sensors", kind: "pwm", senses: "Boom angle", movement: "Hollow shaft on the boom pin, 120 degrees",
    supply: [10, 32], connector: "stagger-2-1-plug", order: ["ground", "supply", "signal"], colours: { supply: "RD", ground: "BK", signal: "WH" }, gaugeMm2: 1,
    healthy: { output: "push-pull", pullUpNeeded: false, frequencyHz: 200, duty: { rest: 0.1, full: 0.9 } },
    value: { name: "Boom angle", unit: "deg", step: 0.5 }, curve: "straight", points: 5, cautions: ["boom", "pulses"],
    sheet: [11, "2023-05-23"], dataSheet: ["DL 81 pin sensors, sheet 4", "2020-06-01"],
    variants: [
      { name: "Excavator boom angle sensor", parts: ["DL 8110-02"], values: [-30, 70] },
      { name: "Excavator dipper angle sensor", parts: ["DL 8112-02", "DL 8012-02"], values: [-140, -20] },
      { name: "Crane jib angle sensor", parts: ["DL 8120-05"], values: [0, 78], points: 7 },
      { name: "Grab rotation sensor", parts: ["DL 8131-01"], values: [0, 115], healthy: { frequencyHz: 150, duty: { rest: 0.9, full: 0.1 } } },
    ],
  },
  {
    maker: "Ivelbrook Hydraulics", kind: "pwm", senses: "Cylinder stroke", movement: "Magnet in the piston, sensor in the cylinder's wall",
    supply: [10, 32], connector: "round-3-plug", order: ["supply", "ground", "signal"], colours: { supply: "BN", ground: "BU", signal: "BK" }, gaugeMm2: 1.5,
    healthy: { output: "push-pull", pullUpNeeded: false, frequencyHz: 500, duty: { rest: 0.04, full: 0.94 } },
    value: { name: "Stroke", unit: "mm", step: 1 }, curve: "straight", points: 6, cautions: ["pressure", "pulses"],
    sheet: [19, "2024-05-14"], dataSheet: ["IVB-S in-cylinder sensors", "2022-01-01"],
    variants: [
      { name: "Lift cylinder stroke sensor, 350 mm", parts: ["IVB-S20-350", "IVB-S18-350"], values: [0, 350] },
      { name: "Lift cylinder stroke sensor, 600 mm", parts: ["IVB-S20-600"], values: [0, 600] },
      { name: "Spud cylinder stroke sensor", parts: ["IVB-S32-1500"], values: [0, 1500], healthy: { frequencyHz: 250 }, points: 9 },
      { name: "Mower wing cylinder stroke sensor", parts: ["IVB-S16-280"], values: [0, 280], healthy: { duty: { rest: 0.05, full: 0.95 } }, points: 3 },
    ],
  },
  {
    maker: "Eskholt Works", kind: "pwm", senses: "Pedal position", movement: "Pedal, 18 degrees, two springs",
    supply: 5, connector: "dropped-3-receptacle", order: ["supply", "ground", "signal"], colours: { supply: "PK", ground: "BK", signal: "TQ" }, gaugeMm2: 0.5,
    healthy: { output: "open-collector", pullUpNeeded: true, frequencyHz: 200, duty: { rest: 0.15, full: 0.8 } },
    value: { name: "Pedal travel", unit: "%", step: 1 }, curve: "straight", points: 3, cautions: ["engine", "pullUp", "fiveVolts"],
    sheet: [58, "2024-11-11"], dataSheet: ["EW6 pedals, issue A", "2021-09-01"],
    variants: [
      { name: "Accelerator pedal, tractor", parts: ["EW6.020.A"], values: [0, 100] },
      { name: "Inching pedal, loader", parts: ["EW6.024.A", "EW5.024.B"], values: [0, 100], healthy: { duty: { rest: 0.85, full: 0.2 } } },
      { name: "Slew pedal, excavator", parts: ["EW6.031.C"], values: [-100, 100], healthy: { frequencyHz: 500 }, points: 5 },
    ],
  },
];
