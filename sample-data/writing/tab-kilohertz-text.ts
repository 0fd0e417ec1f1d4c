import type { AnalyzerTrace } from './analyzer-trace.js';
import { settingsCells, timeCells } from './settings-cells.js';

/** A level in dBm is this much higher in dBµV at 50 Ω: 90 + 10·log10(50). */
const microvoltsOverMilliwattDb = 106.98970004336019;

/** Tabs, kHz and dBµV at 50 Ω: what receivers of the old school write. */
export function tabKilohertzText(trace: AnalyzerTrace): string {
  const preamble = [...timeCells(trace.takenAt), ...settingsCells(trace.settings)]
    .map(([key, value, unit]) => `${key}\t${value} ${unit}`.trimEnd());
  const rows = Array.from(trace.frequencyHz, (atHz, point) =>
    `${(atHz / 1000).toFixed(3)}\t${((trace.levelDbm[point] ?? 0) + microvoltsOverMilliwattDb).toFixed(2)}`);
  return [...preamble, 'Frequency [kHz]\tLevel [dBµV]', ...rows, ''].join('\n');
}
