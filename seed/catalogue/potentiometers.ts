import type { Family } from "./family";

/** Resistive dividers, first half: angles, ropes and the hitch. */
export const POTENTIOMETERS_A: readonly Family[] = [
  {
    maker: "Aldermere Instruments", kind: "potentiometer", senses: "Angle", movement: "Shaft turns with the ladder's pivot, 110 degrees between stops",
    supply: 5, connector: "inline-3-plug", order: ["supply", "signal", "ground"], colours: { supply: "RD", ground: "BK", signal: "WH" }, gaugeMm2: 0.75,
    healthy: { totalOhms: 5000, tolerancePercent: 10, wiperSeriesOhms: 1000, signalRatio: { rest: 0.1, full: 0.9 } },
    value: { name: "Ladder angle", unit: "deg", step: 0.1 }, curve: "straight", points: 5, cautions: ["ladder", "fiveVolts"],
    sheet: [14, "2024-03-12"], dataSheet: ["AMI 4 series, issue 6", "2019-05-01"],
    variants: [
      { name: "Bucket-ladder angle sensor, 45 degrees", parts: ["AMI 4-210 B", "AMI 4-110"], values: [0, 45] },
      { name: "Bucket-ladder angle sensor, 60 degrees", parts: ["AMI 4-216 B"], values: [0, 60], healthy: { signalRatio: { rest: 0.08, full: 0.92 } } },
      { name: "Stern-ladder angle sensor", parts: ["AMI 4-230 C", "AMI 4-130"], values: [-5, 35], healthy: { totalOhms: 4700 }, points: 6 },
    ],
  },
  {
    maker: "Aldermere Instruments", kind: "potentiometer", senses: "Rope length", movement: "Ten-turn track geared to the winch drum",
    supply: 10, connector: "round-3-plug", order: ["supply", "ground", "signal"], colours: { supply: "BN", ground: "BU", signal: "YE" }, gaugeMm2: 0.75,
    healthy: { totalOhms: 10000, tolerancePercent: 5, signalRatio: { rest: 0.04, full: 0.96 } },
    value: { name: "Rope paid out", unit: "m", step: 0.1 }, curve: "drum", points: 7, cautions: ["winch", "wiper"],
    sheet: [22, "2024-06-03"], dataSheet: ["AMI 9 series, issue 3", "2017-11-01"],
    variants: [
      { name: "Ladder winch rope-length sensor", parts: ["AMI 9-510 A"], values: [0, 28] },
      { name: "Spud winch rope-length sensor", parts: ["AMI 9-516 A", "AMI 9-416"], values: [0, 16.5], healthy: { totalOhms: 5000 } },
      { name: "Mooring winch rope-length sensor", parts: ["AMI 9-540 D"], values: [0, 60], points: 9 },
    ],
  },
  {
    maker: "Brackenhow", kind: "potentiometer", senses: "Hitch position", movement: "Lever follows the lift arm, 75 degrees between stops",
    supply: 5, connector: "triangle-3-receptacle", order: ["ground", "signal", "supply"], colours: { supply: "OG", ground: "BK", signal: "GN" }, gaugeMm2: 0.5,
    healthy: { totalOhms: 3300, tolerancePercent: 20, wiperSeriesOhms: 680, signalRatio: { rest: 0.12, full: 0.86 } },
    value: { name: "Lift height", unit: "mm", step: 1 }, curve: "lever", points: 7, cautions: ["hitch", "fiveVolts"],
    sheet: [31, "2023-10-19"], dataSheet: ["BHW 3300 leaflet", "2015-02-01"],
    variants: [
      { name: "Rear hitch position sensor", parts: ["BHW/3307/12", "BHW/3301/12"], values: [0, 720] },
      { name: "Rear hitch position sensor, short arm", parts: ["BHW/3307/09"], values: [0, 540], healthy: { signalRatio: { rest: 0.15, full: 0.78 } } },
      { name: "Front hitch position sensor", parts: ["BHW/3311/12"], values: [40, 690], healthy: { signalRatio: { rest: 0.88, full: 0.14 } } },
      { name: "Mid-mount flail position sensor", parts: ["BHW/3315/07", "BHW/3305/07"], values: [0, 410], healthy: { totalOhms: 2200 }, points: 5 },
    ],
  },
  {
    maker: "Brackenhow", kind: "potentiometer", senses: "Lever position", movement: "Hand lever, 50 degrees, friction held",
    supply: 5, connector: "inline-3-receptacle", order: ["supply", "ground", "signal"], colours: { supply: "RD", ground: "BN", signal: "BU" }, gaugeMm2: 0.5,
    healthy: { totalOhms: 2000, tolerancePercent: 20, wiperSeriesOhms: 1500, signalRatio: { rest: 0.16, full: 0.84 } },
    value: { name: "Engine speed asked for", unit: "rpm", step: 5 }, curve: "straight", points: 4, cautions: ["engine", "fiveVolts"],
    sheet: [33, "2023-11-07"], dataSheet: ["BHW 1200 leaflet", "2016-08-01"],
    variants: [
      { name: "Hand throttle lever, tractor", parts: ["BHW/1207/21"], values: [850, 2300] },
      { name: "Hand throttle lever, work boat", parts: ["BHW/1209/21", "BHW/1202/21"], values: [700, 2600], connector: "inline-3-letters-receptacle" },
      { name: "Pump throttle lever, dredger", parts: ["BHW/1213/04"], values: [600, 1800], healthy: { signalRatio: { rest: 0.82, full: 0.2 } }, points: 5 },
    ],
  },
  {
    maker: "Dunlarch Sensors", kind: "potentiometer", senses: "Paddle position", movement: "Rod runs in and out with the paddle rack",
    supply: 10, connector: "round-3-of-4-plug", order: ["supply", "ground", "signal", null], colours: { supply: "BN", ground: "BU", signal: "BK" }, gaugeMm2: 1,
    healthy: { totalOhms: 5000, tolerancePercent: 10, signalRatio: { rest: 0.05, full: 0.95 } },
    value: { name: "Paddle opening", unit: "mm", step: 1 }, curve: "straight", points: 5, cautions: ["paddle", "wiper"],
    sheet: [8, "2023-04-26"], dataSheet: ["DL 77 rod series, sheet 2", "2018-03-01"],
    variants: [
      { name: "Ground-paddle position sensor, 600 mm", parts: ["DL 7742-03", "DL 7740-03"], values: [0, 600] },
      { name: "Ground-paddle position sensor, 900 mm", parts: ["DL 7743-03"], values: [0, 900], points: 7 },
      { name: "Gate-paddle position sensor", parts: ["DL 7738-01"], values: [0, 450], healthy: { signalRatio: { rest: 0.06, full: 0.9 } } },
      { name: "Side-sluice position sensor", parts: ["DL 7751-06"], values: [0, 1200], healthy: { totalOhms: 10000 }, points: 9, gaugeMm2: 1.5 },
    ],
  },
];
