import type { Family } from "./family";

/** Resistive dividers, second half: booms, rudders, tanks, blades and joysticks. */
export const POTENTIOMETERS_B: readonly Family[] = [
  {
    maker: "Eskholt Works", kind: "potentiometer", senses: "Boom height", movement: "Shaft turns with the boom's foot, 95 degrees between stops",
    supply: 8, connector: "inline-3-letters-plug", order: ["supply", "ground", "signal"], colours: { supply: "RD", ground: "BK", signal: "YE" }, gaugeMm2: 0.75,
    healthy: { totalOhms: 4700, tolerancePercent: 10, wiperSeriesOhms: 470, signalRatio: { rest: 0.09, full: 0.88 } },
    value: { name: "Cutter height above deck", unit: "mm", step: 5 }, curve: "lever", points: 7, cautions: ["boom", "eightVolts"],
    sheet: [17, "2024-04-09"], dataSheet: ["EW2 pivot sensors, issue B", "2020-01-01"],
    variants: [
      { name: "Weed-cutter boom height sensor", parts: ["EW2.118.C", "EW2.118.A"], values: [-1500, 900] },
      { name: "Weed-cutter boom height sensor, long reach", parts: ["EW2.124.C"], values: [-2400, 1300], points: 9 },
      { name: "Loading conveyor height sensor", parts: ["EW2.131.B"], values: [200, 2600], healthy: { signalRatio: { rest: 0.91, full: 0.13 } } },
    ],
  },
  {
    maker: "Fennimoor Electric", kind: "potentiometer", senses: "Rudder angle", movement: "Lever linked to the tiller arm, 90 degrees between stops",
    supply: 12, connector: "stagger-2-1-plug", order: ["supply", "ground", "signal"], colours: { supply: "GY", ground: "BK", signal: "VT" }, gaugeMm2: 1,
    healthy: { totalOhms: 1000, tolerancePercent: 10, signalRatio: { rest: 0.14, full: 0.86 } },
    value: { name: "Rudder angle, starboard positive", unit: "deg", step: 0.5 }, curve: "straight", points: 7, cautions: ["rudder", "wiper"],
    sheet: [26, "2024-08-21"], dataSheet: ["FM-R follow-up units", "2014-09-01"],
    variants: [
      { name: "Rudder angle sensor, 35 degrees", parts: ["FM-R 905/2"], values: [-35, 35] },
      { name: "Rudder angle sensor, 45 degrees", parts: ["FM-R 909/2", "FM-R 809"], values: [-45, 45], healthy: { signalRatio: { rest: 0.1, full: 0.9 } } },
      { name: "Bow-thruster azimuth sensor", parts: ["FM-R 931/1"], values: [-80, 80], healthy: { totalOhms: 2000, tolerancePercent: 5 }, points: 9 },
    ],
  },
  {
    maker: "Garthwick Gauge", kind: "potentiometer", senses: "Tank level", movement: "Float arm, 70 degrees between empty and full",
    supply: 5, connector: "dropped-3-plug", order: ["ground", "supply", "signal"], colours: { supply: "RD", ground: "BK", signal: "GN" }, gaugeMm2: 0.75,
    healthy: { totalOhms: 1800, tolerancePercent: 15, signalRatio: { rest: 0.06, full: 0.94 } },
    value: { name: "Content", unit: "l", step: 1 }, curve: "lying-tank", points: 9, cautions: ["tank", "fiveVolts"],
    sheet: [41, "2023-02-15"], dataSheet: ["GG float senders, list 11", "2013-06-01"],
    variants: [
      { name: "Fuel tank level sensor, 400 litres", parts: ["GG-1140-PX"], values: [8, 392] },
      { name: "Fuel tank level sensor, 900 litres", parts: ["GG-1190-PX", "GG-1090-P"], values: [15, 885] },
      { name: "Hydraulic oil level sensor, 150 litres", parts: ["GG-1115-HX"], values: [20, 145], healthy: { totalOhms: 900, signalRatio: { rest: 0.9, full: 0.1 } }, points: 7 },
    ],
  },
  {
    maker: "Harrowmead", kind: "potentiometer", senses: "Blade tilt", movement: "Rod runs with the tilt cylinder",
    supply: 8, connector: "column-3-plug", order: ["supply", "signal", "ground"], colours: { supply: "OG", ground: "BN", signal: "WH" }, gaugeMm2: 0.75,
    healthy: { totalOhms: 6800, tolerancePercent: 10, wiperSeriesOhms: 1000, signalRatio: { rest: 0.07, full: 0.93 } },
    value: { name: "Cylinder stroke", unit: "mm", step: 1 }, curve: "straight", points: 5, cautions: ["pressure", "eightVolts"],
    sheet: [47, "2024-01-30"], dataSheet: ["HM 52 rod sensors", "2018-10-01"],
    variants: [
      { name: "Bank-mower tilt sensor, 250 mm", parts: ["HM 52 61 08"], values: [0, 250] },
      { name: "Bank-mower tilt sensor, 400 mm", parts: ["HM 52 61 12", "HM 52 41 12"], values: [0, 400], healthy: { totalOhms: 10000 } },
      { name: "Ditch-blade tilt sensor", parts: ["HM 52 66 05"], values: [0, 180], healthy: { signalRatio: { rest: 0.11, full: 0.82 } }, points: 4 },
    ],
  },
  {
    maker: "Corvane Controls", kind: "potentiometer", senses: "Joystick position", movement: "Stick, 20 degrees each side of the middle, spring centred",
    supply: 5, connector: "inline-4-plug", order: ["supply", "signal", "ground", null], colours: { supply: "RD", ground: "BK", signal: "BU" }, gaugeMm2: 0.35,
    healthy: { totalOhms: 5000, tolerancePercent: 20, wiperSeriesOhms: 2200, signalRatio: { rest: 0.1, full: 0.9 } },
    value: { name: "Demand", unit: "%", step: 1 }, curve: "straight", points: 3, cautions: ["boom", "fiveVolts"],
    sheet: [52, "2024-09-17"], dataSheet: ["CV-40 sticks, issue 4", "2019-12-01"],
    variants: [
      { name: "Joystick axis, slew", parts: ["CV-40.01-R", "CV-39.01-R"], values: [-100, 100] },
      { name: "Joystick axis, boom", parts: ["CV-40.02-R"], values: [-100, 100], healthy: { signalRatio: { rest: 0.15, full: 0.85 } } },
      { name: "Thumbwheel, cutter speed", parts: ["CV-44.10-T"], values: [0, 100], healthy: { totalOhms: 10000, wiperSeriesOhms: 1000, signalRatio: { rest: 0.12, full: 0.88 } }, points: 5 },
    ],
  },
];
