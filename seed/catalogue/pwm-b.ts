import type { Family } from "./family";

/** Powered pulse-width devices, second half. */
export const PWM_B: readonly Family[] = [
  {
    maker: "Garthwick Gauge", kind: "pwm", senses: "Tank level", movement: "No moving part: echo from the surface",
    supply: [10, 32], connector: "inline-3-plug", order: ["supply", "ground", "signal"], colours: { supply: "RD", ground: "BK", signal: "GY" }, gaugeMm2: 0.75,
    healthy: { output: "open-collector", pullUpNeeded: true, frequencyHz: 125, duty: { rest: 0.1, full: 0.9 } },
    value: { name: "Content", unit: "l", step: 1 }, curve: "lying-tank", points: 9, cautions: ["tank", "pullUp", "pulses"],
    sheet: [43, "2023-03-08"], dataSheet: ["GG echo senders, list 3", "2021-11-01"],
    variants: [
      { name: "Fuel level echo sensor, 600 litres", parts: ["GG-2260-E"], values: [10, 595] },
      { name: "Fuel level echo sensor, 1200 litres", parts: ["GG-2312-E", "GG-2112-E"], values: [20, 1190] },
      { name: "Waste-water level echo sensor", parts: ["GG-2280-W"], values: [12, 780], healthy: { frequencyHz: 130, duty: { rest: 0.05, full: 0.95 } } },
    ],
  },
  {
    maker: "Harrowmead", kind: "pwm", senses: "Slew angle", movement: "Pinion on the slewing ring, any number of turns, counted within one",
    supply: 12, connector: "round-3-of-4-plug", order: ["supply", "signal", "ground", null], colours: { supply: "OG", ground: "BK", signal: "YE" }, gaugeMm2: 1,
    healthy: { output: "push-pull", pullUpNeeded: false, frequencyHz: 1000, duty: { rest: 0.05, full: 0.95 } },
    value: { name: "Slew angle", unit: "deg", step: 1 }, curve: "straight", points: 5, cautions: ["slew", "pulses"],
    sheet: [49, "2024-02-20"], dataSheet: ["HM 70 ring sensors", "2019-04-01"],
    variants: [
      { name: "Slew angle sensor, excavator", parts: ["HM 70 12 03"], values: [0, 358] },
      { name: "Slew angle sensor, deck crane", parts: ["HM 70 12 09", "HM 70 02 09"], values: [-175, 175] },
      { name: "Conveyor swing sensor", parts: ["HM 70 18 01"], values: [-60, 60], healthy: { frequencyHz: 500, duty: { rest: 0.1, full: 0.9 } }, points: 7 },
      { name: "Chute swing sensor", parts: ["HM 70 18 04"], values: [-95, 95], healthy: { frequencyHz: 500, duty: { rest: 0.92, full: 0.08 } } },
    ],
  },
  {
    maker: "Fennimoor Electric", kind: "pwm", senses: "Inclination", movement: "Tilts with what it is bolted to",
    supply: [10, 32], connector: "triangle-3-plug", order: ["supply", "signal", "ground"], colours: { supply: "BN", ground: "WH", signal: "GN" }, gaugeMm2: 0.5,
    healthy: { output: "open-collector", pullUpNeeded: true, frequencyHz: 250, duty: { rest: 0.1, full: 0.9 } },
    value: { name: "Inclination", unit: "deg", step: 0.1 }, curve: "straight", points: 5, cautions: ["pullUp", "pulses"],
    sheet: [28, "2024-09-03"], dataSheet: ["FM-N level units", "2020-10-01"],
    variants: [
      { name: "Pontoon list sensor", parts: ["FM-N 110/1"], values: [-10, 10] },
      { name: "Pontoon trim sensor", parts: ["FM-N 110/2", "FM-N 100/2"], values: [-5, 5], healthy: { frequencyHz: 200 } },
      { name: "Bank-mower head inclination sensor", parts: ["FM-N 145/1"], values: [-45, 65], points: 7 },
      { name: "Chassis inclination sensor", parts: ["FM-N 120/1"], values: [-20, 20], healthy: { output: "push-pull", pullUpNeeded: false } },
    ],
  },
  {
    maker: "Aldermere Instruments", kind: "pwm", senses: "Force", movement: "Pin that bends under load, no visible travel",
    supply: 8, connector: "column-3-receptacle", order: ["supply", "ground", "signal"], colours: { supply: "RDBU", ground: "BKWH", signal: "GNWH" }, gaugeMm2: 0.75,
    healthy: { output: "push-pull", pullUpNeeded: false, frequencyHz: 400, duty: { rest: 0.2, full: 0.8 } },
    value: { name: "Force", unit: "kN", step: 0.1 }, curve: "straight", points: 4, cautions: ["load", "pulses", "eightVolts"],
    sheet: [62, "2025-01-15"], dataSheet: ["AMI 12 load pins, issue 2", "2021-07-01"],
    variants: [
      { name: "Hitch draught pin, 60 kN", parts: ["AMI 12-060 F"], values: [0, 60] },
      { name: "Hitch draught pin, 90 kN", parts: ["AMI 12-090 F", "AMI 11-090"], values: [0, 90] },
      { name: "Winch line-pull pin, 50 kN", parts: ["AMI 12-050 W"], values: [0, 50], healthy: { duty: { rest: 0.1, full: 0.9 } } },
      { name: "Ladder hoist load pin, 150 kN", parts: ["AMI 12-150 W"], values: [0, 150], healthy: { duty: { rest: 0.1, full: 0.85 }, frequencyHz: 200 }, points: 6 },
    ],
  },
];
