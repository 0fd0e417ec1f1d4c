import type { AnalyzerTrace } from './analyzer-trace.js';
import { commaRows } from './plain-text.js';
import { axisCells, settingsCells, timeCells } from './settings-cells.js';

/** A preamble of key, value and unit, then column names and comma-separated rows, DOS line ends. */
export function preambleText(trace: AnalyzerTrace): string {
  const cells = [...timeCells(trace.takenAt), ...axisCells(trace.frequencyHz), ...settingsCells(trace.settings)];
  return [
    'Instrument,Bench analyser BA-6,', ...cells.map((cell) => cell.join(',')),
    'Frequency [Hz],Level [dBm]', ...commaRows(trace), '',
  ].join('\r\n');
}
