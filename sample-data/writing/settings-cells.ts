import type { AnalyzerSettings } from './analyzer-trace.js';

/** A preamble line before it is joined: what, how much, and in which unit (empty where there is none). */
export type PreambleCell = readonly [key: string, value: string, unit: string];

/** The settings as preamble cells; none where the file is to keep them to itself. */
export function settingsCells(settings: AnalyzerSettings | null): PreambleCell[] {
  if (settings === null) return [];
  return [
    ['RBW', (settings.rbwHz / 1000).toString(), 'kHz'],
    ['VBW', (settings.vbwHz / 1000).toString(), 'kHz'],
    ['Detector', settings.detector, ''],
    ['Trace Mode', settings.traceMode, ''],
    ['Sweep Count', settings.held.toString(), ''],
    ['Attenuation', settings.inputAttenuationDb.toString(), 'dB'],
    ['Reference Level', settings.referenceLevelDbm.toString(), 'dBm'],
  ];
}

/** Date and time of day as cells. */
export function timeCells(takenAt: string): PreambleCell[] {
  return [['Date', takenAt.slice(0, 10), ''], ['Time', takenAt.slice(11, 19), '']];
}

/** Where the axis begins and ends, and how many points it has. */
export function axisCells(frequencyHz: Float64Array): PreambleCell[] {
  return [
    ['Start Frequency', (frequencyHz[0] ?? 0).toString(), 'Hz'],
    ['Stop Frequency', (frequencyHz.at(-1) ?? 0).toString(), 'Hz'],
    ['Number of Points', frequencyHz.length.toString(), ''],
  ];
}
