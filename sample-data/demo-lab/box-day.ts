import { leakyEnclosure, type BenchDay, type OnTheBench, type PlannedSweep } from './bench-day.js';
import type { DemoLevel } from './demo-manifest.js';

const boxM = [0.18, 0.12, 0.06] as const;
const bagM = [0.4, 0.3, 0.05] as const;
const at = (time: string): string => `2026-11-24T${time}:00+01:00`;
const onTheBench = (sampleCode: string, condition: string, enclosure: OnTheBench['enclosure']): OnTheBench => ({ sampleCode, condition, enclosure });

const sweeps: PlannedSweep[] = [
  { path: 'boxes/reference-opening.csv', layout: 'levels only', role: 'reference', onTheBench: null, driftDb: 0, measuredAt: at('13:05') },
  { path: 'boxes/enclosed-TC-007-both-clasps.csv', layout: 'plain', role: 'enclosed', driftDb: 0.1, measuredAt: at('13:30'),
    onTheBench: onTheBench('TC-007', 'both clasps shut', leakyEnclosure(boxM, 84, 0.000_2)) },
  { path: 'boxes/enclosed-TC-009-bent-clasp.csv', layout: 'plain', role: 'enclosed', driftDb: 0.15, measuredAt: at('13:50'),
    onTheBench: onTheBench('TC-009', 'one clasp bent', leakyEnclosure(boxM, 84, 0.004_5)) },
  { path: 'boxes/enclosed-SR-102-three-rolls.csv', layout: 'UTF-16', role: 'enclosed', driftDb: 0.2, measuredAt: at('14:20'),
    onTheBench: onTheBench('SR-102', 'rolled three times', leakyEnclosure(bagM, 92, 0.000_28)) },
  { path: 'boxes/reference-closing.csv', layout: 'levels only', role: 'reference', onTheBench: null, driftDb: 0.3, measuredAt: at('14:45') },
];

/** A comb generator with a carrier every 60 MHz, no noise sweep: the floor stands between the carriers. */
export const boxDay: BenchDay = {
  seed: 2400, startHz: 3e7, stopHz: 6e9, points: 1991,
  settings: {
    rbwHz: 30_000, vbwHz: 100_000, detector: 'Positive Peak', traceMode: 'Max Hold', held: 10, inputAttenuationDb: 0, referenceLevelDbm: 0,
  },
  receiver: { noiseFigureDb: 21, inputAttenuationDb: 0, noiseSlopeDbPerSixGigahertz: 6 },
  chain: { levelDbm: -30, cableLossDbAtGigahertz: 8, antennaCornerHz: 6e7, rippleDb: 0.8, ripplePeriodHz: 1.4e8 },
  carrierStepHz: 6e7, sweeps,
};

const byEye = 'checked by eye, both clasps shut';
const spots: readonly [frequencyHz: number, openDbm: number, insideDbm: number, inTheNoise: boolean][] = [
  [433_920_000, -12.3, -78.9, false], [868_300_000, -14.1, -77.5, false], [2_450_000_000, -21.6, -72.8, false], [144_500_000, -11, -95, true],
];

/** Three handheld transmitters and a beacon, read off the screen in the open and in the box. */
export const boxLevels: DemoLevel[] = spots.flatMap(([frequencyHz, openDbm, insideDbm, inTheNoise]) => [
  { role: 'reference', sampleCode: null, condition: null, frequencyHz, levelDbm: openDbm, inTheNoise: false },
  { role: 'enclosed', sampleCode: 'TC-007', condition: byEye, frequencyHz, levelDbm: insideDbm, inTheNoise },
]);
