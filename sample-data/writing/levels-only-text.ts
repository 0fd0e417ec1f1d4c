import type { AnalyzerTrace } from './analyzer-trace.js';
import { axisCells, settingsCells, timeCells } from './settings-cells.js';

/** Levels alone, one a line; start, stop and the number of points stand in the preamble. */
export function levelsOnlyText(trace: AnalyzerTrace): string {
  const preamble = [...timeCells(trace.takenAt), ...axisCells(trace.frequencyHz), ...settingsCells(trace.settings)]
    .map(([key, value, unit]) => [key, value, unit].filter((cell) => cell !== '').join(','));
  const rows = Array.from(trace.levelDbm, (levelDbm) => levelDbm.toFixed(2));
  return [...preamble, 'Y Axis Unit,dBm', 'Level (dBm)', ...rows, ''].join('\n');
}
