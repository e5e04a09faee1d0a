import type { Family } from "./family";

/** Powered devices with an analogue voltage output. */
export const VOLTAGE: readonly Family[] = [
  {
    maker: "Ivelbrook Hydraulics", kind: "voltage", senses: "Pressure", movement: "No moving part: bridge behind a diaphragm",
    supply: 5, connector: "inline-3-receptacle", order: ["ground", "supply", "signal"], colours: { supply: "RD", ground: "BK", signal: "WH" }, gaugeMm2: 0.75,
    healthy: { signalVolts: { rest: 0.5, full: 4.5 } },
    value: { name: "Pressure", unit: "bar", step: 0.1 }, curve: "straight", points: 5, cautions: ["pressure", "fiveVolts"],
    sheet: [36, "2023-12-05"], dataSheet: ["IVB-P transducers, issue 5", "2022-05-01"],
    variants: [
      { name: "Hydraulic pressure sensor, 16 bar", parts: ["IVB-P16-016"], values: [0, 16] },
      { name: "Hydraulic pressure sensor, 100 bar", parts: ["IVB-P16-100", "IVB-P12-100"], values: [0, 100] },
      { name: "Hydraulic pressure sensor, 250 bar", parts: ["IVB-P16-250", "IVB-P12-250"], values: [0, 250] },
      { name: "Hydraulic pressure sensor, 400 bar", parts: ["IVB-P16-400"], values: [0, 400], connector: "round-3-receptacle" },
      { name: "Charge pressure sensor, 40 bar", parts: ["IVB-P18-040"], values: [0, 40], healthy: { signalVolts: { rest: 0.25, full: 4.75 } }, points: 3 },
    ],
  },
  {
    maker: "Garthwick Gauge", kind: "voltage", senses: "Water level", movement: "No moving part: pressure of the water above it",
    supply: [10, 32], connector: "round-3-of-4-receptacle", order: ["supply", "ground", "signal", null], colours: { supply: "BN", ground: "WH", signal: "GN" }, gaugeMm2: 0.5,
    healthy: { signalVolts: { rest: 0.5, full: 4.5 } },
    value: { name: "Depth of water", unit: "m", step: 0.01 }, curve: "straight", points: 5, cautions: ["water", "paddle"],
    sheet: [44, "2023-03-29"], dataSheet: ["GG depth probes, list 6", "2020-02-01"],
    variants: [
      { name: "Lock chamber level probe, 5 m", parts: ["GG-3050-D"], values: [0, 5] },
      { name: "Lock chamber level probe, 10 m", parts: ["GG-3100-D", "GG-3010-D"], values: [0, 10] },
      { name: "Side-pond level probe", parts: ["GG-3025-D"], values: [0, 2.5], healthy: { signalVolts: { rest: 1, full: 6 } } },
    ],
  },
  {
    maker: "Dunlarch Sensors", kind: "voltage", senses: "Angle", movement: "Magnet on the shaft's end, contactless",
    supply: 5, connector: "triangle-3-plug", order: ["supply", "ground", "signal"], colours: { supply: "OG", ground: "BK", signal: "GN" }, gaugeMm2: 0.5,
    healthy: { signalVolts: { rest: 0.5, full: 4.5 } },
    value: { name: "Angle", unit: "deg", step: 0.5 }, curve: "straight", points: 4, cautions: ["fiveVolts", "paddle"],
    sheet: [9, "2023-05-04"], dataSheet: ["DL 83 shaft sensors, sheet 1", "2021-01-01"],
    variants: [
      { name: "Lock-gate angle sensor", parts: ["DL 8304-01"], values: [0, 72] },
      { name: "Swing-bridge angle sensor", parts: ["DL 8306-01", "DL 8206-01"], values: [0, 90] },
      { name: "Sluice valve angle sensor", parts: ["DL 8309-04"], values: [0, 90], healthy: { signalVolts: { rest: 4.5, full: 0.5 } } },
      { name: "Reed-rake arm angle sensor", parts: ["DL 8315-02"], values: [-15, 110], healthy: { signalVolts: { rest: 0.4, full: 4.6 } }, points: 6 },
    ],
  },
  {
    maker: "Brackenhow", kind: "voltage", senses: "Force", movement: "Three rollers bend the rope a little",
    supply: 10, connector: "stagger-2-1-receptacle", order: ["supply", "signal", "ground"], colours: { supply: "RD", ground: "BU", signal: "WH" }, gaugeMm2: 1,
    healthy: { signalVolts: { rest: 1, full: 9 } },
    value: { name: "Rope tension", unit: "kN", step: 0.1 }, curve: "late", points: 6, cautions: ["load", "winch"],
    sheet: [34, "2023-11-21"], dataSheet: ["BHW 5100 leaflet", "2017-04-01"],
    variants: [
      { name: "Rope tension sensor, 20 kN", parts: ["BHW/5102/20"], values: [0, 20] },
      { name: "Rope tension sensor, 50 kN", parts: ["BHW/5105/20", "BHW/5005/20"], values: [0, 50] },
      { name: "Chain tension sensor, weed conveyor", parts: ["BHW/5111/08"], values: [0, 8], healthy: { signalVolts: { rest: 0.8, full: 8 } }, points: 4 },
    ],
  },
  {
    maker: "Corvane Controls", kind: "voltage", senses: "Lever position", movement: "Hand lever, 40 degrees, contactless",
    supply: 5, connector: "inline-4-plug", order: ["supply", "ground", null, "signal"], colours: { supply: "RD", ground: "BK", signal: "VT" }, gaugeMm2: 0.35,
    healthy: { signalVolts: { rest: 0.5, full: 4.5 } },
    value: { name: "Demand", unit: "%", step: 1 }, curve: "straight", points: 3, cautions: ["boom", "fiveVolts"],
    sheet: [56, "2024-10-15"], dataSheet: ["CV-66 levers, issue 1", "2022-08-01"],
    variants: [
      { name: "Auxiliary lever, conveyor speed", parts: ["CV-66.01-S"], values: [0, 100] },
      { name: "Auxiliary lever, cutter speed", parts: ["CV-66.02-S", "CV-65.02-S"], values: [0, 100], healthy: { signalVolts: { rest: 0.7, full: 4.3 } } },
      { name: "Auxiliary lever, grab", parts: ["CV-66.05-D"], values: [-100, 100], healthy: { signalVolts: { rest: 0.5, full: 4.5 } }, points: 5 },
    ],
  },
  {
    maker: "Fennimoor Electric", kind: "voltage", senses: "Air pressure", movement: "No moving part: bridge behind a diaphragm",
    supply: 12, connector: "dropped-3-plug", order: ["supply", "ground", "signal"], colours: { supply: "RD", ground: "BK", signal: "YE" }, gaugeMm2: 0.5,
    healthy: { signalVolts: { rest: 1, full: 5 } },
    value: { name: "Pressure", unit: "kPa", step: 1 }, curve: "straight", points: 4, cautions: ["pressure"],
    sheet: [29, "2024-09-10"], dataSheet: ["FM-P air units", "2018-12-01"],
    variants: [
      { name: "Brake air pressure sensor", parts: ["FM-P 310/1"], values: [0, 1000] },
      { name: "Boost pressure sensor", parts: ["FM-P 325/1", "FM-P 225/1"], values: [-20, 250], healthy: { signalVolts: { rest: 0.5, full: 4.5 } } },
      { name: "Filter vacuum sensor", parts: ["FM-P 302/3"], values: [0, 25], healthy: { signalVolts: { rest: 0.5, full: 8.5 } }, points: 5 },
      { name: "Bubbler line pressure sensor, sluice", parts: ["FM-P 308/2"], values: [0, 60] },
    ],
  },
];
