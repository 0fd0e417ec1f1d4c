import type { AnalyzerTrace } from './analyzer-trace.js';
import { settingsCells, timeCells } from './settings-cells.js';

const withComma = (number: string): string => number.replace('.', ',');

/** Semicolons between cells and a decimal comma, MHz and dBm, as an office program in much of Europe writes it. */
export function decimalCommaText(trace: AnalyzerTrace): string {
  const preamble = [...timeCells(trace.takenAt), ...settingsCells(trace.settings)]
    .map(([key, value, unit]) => `${key};${withComma(value)};${unit}`);
  const rows = Array.from(trace.frequencyHz, (atHz, point) =>
    `${withComma((atHz / 1e6).toFixed(6))};${withComma((trace.levelDbm[point] ?? 0).toFixed(2))}`);
  return [...preamble, 'Frequency (MHz);Level (dBm)', ...rows, ''].join('\n');
}
