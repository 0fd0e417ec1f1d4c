import { describe, expect, it } from 'vitest';
import type { AnalyzerTrace } from './analyzer-trace.js';
import { fileLayouts, traceBytes, type FileLayout } from './trace-bytes.js';

const trace: AnalyzerTrace = {
  frequencyHz: Float64Array.of(30_000_000, 1_234_567_891, 6_000_000_000), levelDbm: Float64Array.of(-12.34, -101.05, 3.5),
  takenAt: '2026-11-10T09:05:00',
  settings: { rbwHz: 10_000, vbwHz: 30_000, detector: 'Positive Peak', traceMode: 'Max Hold', held: 12, inputAttenuationDb: 0, referenceLevelDbm: -5 },
};

/** What a person would do with the file: decode it, split the rows by eye, apply the units in the header. */
function naiveRows(bytes: Uint8Array, layout: FileLayout): number[][] {
  const text = layout === 'UTF-16' ? Buffer.from(bytes.slice(2)).toString('utf16le') : Buffer.from(bytes).toString('utf8');
  const lines = text.split(/\r?\n/).filter((line) => line !== '');
  const cells = (separator: string): number[][] =>
    lines.map((line) => line.split(separator).map((cell) => Number(cell.replace(',', '.')))).filter((row) => row.length === 2 && row.every(Number.isFinite));
  if (layout === 'levels only') return lines.slice(-3).map((line, at) => [trace.frequencyHz[at] ?? 0, Number(line)]);
  if (layout === 'decimal comma') return cells(';').map(([megahertz = 0, levelDbm = 0]) => [megahertz * 1e6, levelDbm]);
  if (layout === 'tab kHz dBµV') return cells('\t').map(([kilohertz = 0, level = 0]) => [kilohertz * 1e3, level - 106.9897]);
  if (layout === 'key: value') return cells(',').map(([megahertz = 0, levelDbm = 0]) => [megahertz * 1e6, levelDbm]);
  return cells(',');
}

describe('traceBytes', () => {
  it.each(fileLayouts)('writes a trace as %s so that a naive reader finds every row', (layout) => {
    const rows = naiveRows(traceBytes(trace, layout), layout);
    expect(rows).toHaveLength(3);
    rows.forEach(([frequencyHz = 0, levelDbm = 0], row) => {
      expect(Math.abs(frequencyHz - (trace.frequencyHz[row] ?? 0))).toBeLessThan(0.5);
      expect(Math.abs(levelDbm - (trace.levelDbm[row] ?? 0))).toBeLessThan(0.0101);
    });
  });

  it.each(fileLayouts)('writes settings as %s only where it was told to', (layout) => {
    const text = (settings: AnalyzerTrace['settings']): string => Buffer.from(traceBytes({ ...trace, settings }, layout)).toString('latin1').replaceAll('\0', '');
    expect(text(trace.settings)).toMatch(/RBW.*10/);
    expect(text(trace.settings)).toMatch(/Sweep Count.*12/);
    expect(text(null)).not.toMatch(/RBW|Sweep Count|Max Hold/);
  });

  it('marks UTF-16 with a byte order mark and no other layout', () => {
    for (const layout of fileLayouts) expect(traceBytes(trace, layout)[0] === 0xff).toBe(layout === 'UTF-16');
  });
});
