/** AWG rows: diameter (ASTM B258), section, and ideal copper at 20 °C (computed from IACS). */
export const COPPER_TABLE = [
  { awg: 22, diameterMm: 0.6438, areaMm2: 0.3255, milliohmsPerMetre: 52.96 },
  { awg: 20, diameterMm: 0.8118, areaMm2: 0.5176, milliohmsPerMetre: 33.31 },
  { awg: 18, diameterMm: 1.0237, areaMm2: 0.823, milliohmsPerMetre: 20.95 },
  { awg: 16, diameterMm: 1.2908, areaMm2: 1.3087, milliohmsPerMetre: 13.17 },
  { awg: 14, diameterMm: 1.6277, areaMm2: 2.0809, milliohmsPerMetre: 8.285 },
  { awg: 12, diameterMm: 2.0525, areaMm2: 3.3088, milliohmsPerMetre: 5.211 },
  { awg: 10, diameterMm: 2.5882, areaMm2: 5.2612, milliohmsPerMetre: 3.277 },
] as const;
