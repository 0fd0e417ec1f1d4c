import type { AnalyzerTrace } from './analyzer-trace.js';
import { settingsCells } from './settings-cells.js';

/** Rows of frequency and level, two decimals. */
export const commaRows = (trace: AnalyzerTrace): string[] =>
  Array.from(trace.frequencyHz, (atHz, point) => `${atHz.toString()},${(trace.levelDbm[point] ?? 0).toFixed(2)}`);

/** Column names, then rows; settings, where the file tells them, in comment lines above. */
export function plainText(trace: AnalyzerTrace): string {
  const comments = settingsCells(trace.settings).map(([key, value, unit]) => `# ${key}: ${value} ${unit}`.trimEnd());
  return [...comments, 'Frequency (Hz),Level (dBm)', ...commaRows(trace), ''].join('\n');
}
