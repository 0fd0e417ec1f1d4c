import { readTraceBytes } from '@leeside/trace-reading/read-trace-file';
import { describe, expect, it } from 'vitest';
import { frequencyAxisHz } from '../../sample-data/physics/frequency-axis.js';
import { randomSource } from '../../sample-data/physics/random-source.js';
import type { AnalyzerTrace } from '../../sample-data/writing/analyzer-trace.js';
import { fileLayouts, traceBytes, type FileLayout } from '../../sample-data/writing/trace-bytes.js';

const random = randomSource(41);
const frequencyHz = frequencyAxisHz(3e7, 6e9, 701);
const trace: AnalyzerTrace = {
  frequencyHz, levelDbm: frequencyHz.map(() => Math.round(-9000 + 600 * random.gaussian()) / 100), takenAt: '2026-11-10T09:05:30',
  settings: { rbwHz: 10_000, vbwHz: 30_000, detector: 'Positive Peak', traceMode: 'Max Hold', held: 12, inputAttenuationDb: 10, referenceLevelDbm: -5 },
};

function readBack(layout: FileLayout, written: AnalyzerTrace) {
  const reading = readTraceBytes(traceBytes(written, layout), { fileName: 'trace.csv' });
  if (reading.kind !== 'read') throw new Error(JSON.stringify(reading));
  expect(reading.sweeps).toHaveLength(1);
  const [only] = reading.sweeps;
  if (only === undefined) throw new Error('No sweep');
  return { ...only, transcription: reading.transcription };
}

describe.each(fileLayouts)('a trace written as %s', (layout) => {
  it('is read back to the written levels at the written frequencies', () => {
    const { sweep, transcription } = readBack(layout, trace);
    expect(sweep.levelUnit).toBe('dBm');
    expect(transcription.rowsKept).toBe(701);
    expect(sweep.frequencyHz).toHaveLength(701);
    sweep.frequencyHz.forEach((readHz, row) => {
      expect(Math.abs(readHz - (frequencyHz[row] ?? NaN))).toBeLessThanOrEqual(0.5);
      expect(Math.abs((sweep.level[row] ?? NaN) - (trace.levelDbm[row] ?? NaN))).toBeLessThan(0.0051);
    });
  });

  it('is read back with its settings, or with none where none were written', () => {
    expect(readBack(layout, trace).sweep.settings).toMatchObject({
      rbwHz: 10_000, vbwHz: 30_000, detector: 'peak', traceMode: 'max hold', held: 12, attenuationDb: 10, referenceLevelDbm: -5,
    });
    const silent = readBack(layout, { ...trace, settings: null }).sweep.settings;
    for (const key of ['rbwHz', 'vbwHz', 'detector', 'traceMode', 'held', 'attenuationDb'] as const) expect(silent).not.toHaveProperty(key);
  });
});

describe('the time of a trace', () => {
  it.each(['preamble', 'decimal comma', 'tab kHz dBµV', 'levels only', 'UTF-16'] as const)('is kept as %s tells it', (layout) => {
    const { measuredAt, measuredAtText } = readBack(layout, trace);
    expect(measuredAtText).toBe('2026-11-10 09:05:30');
    // The bench's clock tells no zone, and none is made up.
    expect(measuredAt).toBeUndefined();
  });
});
