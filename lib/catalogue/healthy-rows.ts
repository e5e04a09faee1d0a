import { formatQuantity, largestOhmsPerMetre } from "@/lib/units";
import { pulseMean } from "@/lib/waveform";
import type { EntryData, RestFull } from "./entry-data";
import { supplyWords } from "./supply-words";

/** One healthy reading: what it is, its value, and how it is taken. */
export interface HealthyRow { readonly name: string; readonly value: string; readonly how: string }

const cavityOf = (data: EntryData, role: string) => data.pins.find((pin) => pin.role === role)?.cavity ?? "?";

function spanRows(name: string, span: RestFull, words: (value: number) => string, how: string): HealthyRow[] {
  return [{ name: `${name} at rest`, value: words(span.rest), how }, { name: `${name} at full travel`, value: words(span.full), how }];
}

function potentiometerRows(data: EntryData): HealthyRow[] {
  const { totalOhms, tolerancePercent, wiperSeriesOhms, signalRatio } = data.healthy;
  const [supply, ground, signal] = [cavityOf(data, "supply"), cavityOf(data, "ground"), cavityOf(data, "signal")];
  const rows: HealthyRow[] = [];
  if (totalOhms !== undefined) {
    const share = (tolerancePercent ?? 0) / 100;
    const limits = `${formatQuantity(totalOhms * (1 - share), "ohm")} to ${formatQuantity(totalOhms * (1 + share), "ohm")}`;
    rows.push({ name: "Total resistance", value: `${formatQuantity(totalOhms, "ohm")} ± ${tolerancePercent ?? "?"}\u00a0% (${limits})`, how: `Ohms between ${supply} and ${ground} of the device; connector parted, power off` });
  }
  rows.push({
    name: "In series with the wiper", value: wiperSeriesOhms ? formatQuantity(wiperSeriesOhms, "ohm") : "none stated",
    how: `Ohms between ${supply} and ${signal}, plus ${signal} and ${ground}, less the total, halved; parted, power off`,
  });
  const volts = (ratio: number) => (data.supply.type === "fixed" ? `, ${formatQuantity(ratio * data.supply.volts, "volt")}` : "");
  if (signalRatio) rows.push(...spanRows("Signal", signalRatio, (ratio) => `${formatQuantity(ratio, "ratio")} of supply${volts(ratio)}`, `DC volts, red lead on ${signal}, black on ${ground}; mated, power on`));
  return rows;
}

/** A meter on DC volts shows the mean of the pulses, so that they look like a steady level. */
function meanRow(duty: RestFull, swing: number, how: string): HealthyRow {
  const mean = (share: number) => formatQuantity(pulseMean({ low: 0, high: swing }, share), "volt");
  return {
    name: "Mean of the pulses", value: `${mean(duty.rest)} at rest, ${mean(duty.full)} at full travel`,
    how: `DC volts, ${how}; for pulses from 0 to ${formatQuantity(swing, "volt")}, others in proportion. Volts alone do not tell pulses from a steady level`,
  };
}

/** What new wire may have at most, for the gauges that the standard lists. */
function wireRow(data: EntryData): HealthyRow[] {
  const gauges = [...new Set(data.pins.map((pin) => pin.gaugeMm2))].sort((a, b) => a - b);
  const listed = gauges.flatMap((gauge) => {
    const ohms = largestOhmsPerMetre(gauge);
    return ohms === null ? [] : [`${gauge}\u00a0mm²: ${formatQuantity(ohms, "ohm")} a metre at most`];
  });
  if (listed.length === 0) return [];
  return [{ name: "Wires", value: listed.join(", "), how: "New fine-stranded copper at 20\u00a0°C, IEC 60228 class 5; the meter's leads alone have 0.2 to 0.5\u00a0Ω, so ohms show a break, not a little resistance" }];
}

function pwmRows(data: EntryData): HealthyRow[] {
  const { duty, frequencyHz, output, pullUpNeeded } = data.healthy;
  const how = `red lead on ${cavityOf(data, "signal")}, black on ${cavityOf(data, "ground")}; mated, power on`;
  const kind = output === "open-collector" ? "Open collector" : "Push-pull";
  return [
    { name: "Output", value: `${kind}, ${pullUpNeeded ? "needs a pull-up" : "no pull-up needed"}`, how: pullUpNeeded ? "The pull-up is in the controller: no signal when parted" : "Drives both ways by itself" },
    ...(frequencyHz === undefined ? [] : [{ name: "Frequency", value: formatQuantity(frequencyHz, "hertz"), how: `Hz, ${how}` }]),
    ...(duty ? spanRows("Duty", duty, (value) => `${formatQuantity(value, "ratio")} high`, `Duty, ${how}`) : []),
    ...(duty && data.supply.type === "fixed" ? [meanRow(duty, data.supply.volts, how)] : []),
  ];
}

function voltageRows(data: EntryData): HealthyRow[] {
  const how = `DC volts, red lead on ${cavityOf(data, "signal")}, black on ${cavityOf(data, "ground")}; mated, power on`;
  return data.healthy.signalVolts ? spanRows("Signal", data.healthy.signalVolts, (value) => formatQuantity(value, "volt"), how) : [];
}

/** Readings of a healthy device with units, and between which cavities each is taken; supply first. */
export function healthyRows(data: EntryData): readonly HealthyRow[] {
  const supply: HealthyRow = { name: "Supply", value: supplyWords(data.supply), how: `DC volts, red lead on ${cavityOf(data, "supply")}, black on ${cavityOf(data, "ground")}; power on` };
  const rows = { potentiometer: potentiometerRows, pwm: pwmRows, voltage: voltageRows }[data.kind](data);
  return [supply, ...rows, ...wireRow(data)];
}
