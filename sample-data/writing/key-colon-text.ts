import type { AnalyzerTrace } from './analyzer-trace.js';
import { settingsCells } from './settings-cells.js';

const padded = (value: number, width: number, decimals: number): string => {
  const digits = Math.abs(value).toFixed(decimals).padStart(width, '0');
  return value < 0 ? `-${digits}` : digits;
};
const megahertz = (hertz: number): string => padded(hertz / 1e6, 11, 6);

/** `key: value,` lines with the unit in the value, then zero-padded rows in MHz and dBm without column names: a hand-held analyzer. */
export function keyColonText(trace: AnalyzerTrace): string {
  const { settings, frequencyHz } = trace;
  const preamble = [
    'Model Type: PALM-6,',
    `Start Frequency: ${megahertz(frequencyHz[0] ?? 0)} MHz,`,
    `Stop Frequency: ${megahertz(frequencyHz.at(-1) ?? 0)} MHz,`,
    `Points: ${frequencyHz.length.toString()},`,
    ...settingsCells(settings).map(([key, value, unit]) => `${key}: ${value}${unit},`),
  ];
  // The unit of the levels stands nowhere but here, so that this line is written even without the other settings.
  if (settings === null) preamble.push('Reference Level: 0dBm,');
  const rows = Array.from(frequencyHz, (atHz, point) => `${megahertz(atHz)},${padded(trace.levelDbm[point] ?? 0, 6, 2)}`);
  return [...preamble, ...rows, ''].join('\n');
}
