/** Annealed copper at 20 °C, ohm mm²/m: IACS 100 % (NBS Handbook 100, 1966). */
export const COPPER_OHM_MM2_PER_M = 0.017241;
/** Temperature coefficient at 20 °C, per kelvin. */
export const COPPER_PER_KELVIN = 0.00393;

/** Resistance at a temperature (°C) over resistance at 20 °C, exact-copper form. */
export function copperFactor(celsius: number): number {
  return 1 + COPPER_PER_KELVIN * (celsius - 20);
}

/** IEC 60228 factor that brings a resistance measured at a temperature (°C) to 20 °C; its rounded form with 0.004 /K. */
export function iec60228Factor(celsius: number): number {
  return 250 / (230 + celsius);
}

/** Diameter of a solid round wire, mm, by AWG number (ASTM B258): 0 is 1/0, -3 is 4/0. */
export function awgDiameterMm(gauge: number): number {
  return 0.127 * 92 ** ((36 - gauge) / 39);
}

/** Cross-section, mm², by AWG number. */
export function awgAreaMm2(gauge: number): number {
  return (Math.PI / 4) * awgDiameterMm(gauge) ** 2;
}

/** Resistance of ideal annealed copper, ohms: length in m, cross-section in mm², temperature in °C. Strand adds up to 16 %. */
export function wireOhms(lengthM: number, areaMm2: number, celsius = 20): number {
  return ((COPPER_OHM_MM2_PER_M * lengthM) / areaMm2) * copperFactor(celsius);
}

/** IEC 60228 class 5 (fine stranded) copper, largest resistance at 20 °C, ohm/km: [mm², plain, tinned]. */
const CLASS_5: readonly (readonly [areaMm2: number, plain: number, tinned: number])[] = [
  [0.5, 39.0, 40.1], [0.75, 26.0, 26.7], [1, 19.5, 20.0], [1.5, 13.3, 13.7],
  [2.5, 7.98, 8.21], [4, 4.95, 5.09], [6, 3.3, 3.39], [10, 1.91, 1.95],
];

/** Most that one metre of new fine-stranded wire may have at 20 °C, ohms (IEC 60228 class 5), or null for a size not in its table. */
export function largestOhmsPerMetre(areaMm2: number, metal: "plain" | "tinned" = "plain"): number | null {
  const row = CLASS_5.find(([area]) => area === areaMm2);
  return row ? (metal === "plain" ? row[1] : row[2]) / 1000 : null;
}
