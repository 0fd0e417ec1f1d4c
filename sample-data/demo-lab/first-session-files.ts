import { leakyEnclosure, type BenchDay } from './bench-day.js';
import { pouchDay } from './pouch-day.js';
import { sweepBenchDay } from './sweep-bench-day.js';

const at = (time: string): string => `2026-11-30T${time}:00+01:00`;

const firstSession: BenchDay = {
  ...pouchDay, seed: 3000, stopHz: 3e9, points: 401,
  sweeps: [
    { path: 'reference-opening.csv', layout: 'preamble', role: 'reference', onTheBench: null, driftDb: 0, measuredAt: at('09:00') },
    { path: 'noise-generator-off.csv', layout: 'preamble', role: 'noise', onTheBench: null, driftDb: 0, measuredAt: at('09:10') },
    { path: 'enclosed-MP24-011.csv', layout: 'preamble', role: 'enclosed', driftDb: 0, measuredAt: at('09:20'),
      onTheBench: { sampleCode: 'MP24-011', condition: '', enclosure: leakyEnclosure([0.2, 0.12, 0.02], 96, 0.000_25) } },
  ],
};

/** Three small files for the first try: their names say role and sample. */
export function firstSessionFiles(): Map<string, Uint8Array> {
  return sweepBenchDay(firstSession);
}
