import { leakyEnclosure, type BenchDay, type OnTheBench, type PlannedSweep } from './bench-day.js';

const pouchM = [0.2, 0.12, 0.02] as const;
const bagM = [0.4, 0.3, 0.05] as const;
const at = (time: string): string => `2026-11-17T${time}:00+01:00`;

const onTheBench = (sampleCode: string, condition: string, enclosure: OnTheBench['enclosure']): OnTheBench => ({ sampleCode, condition, enclosure });
const asDelivered = 'as delivered, folded twice';

const sweeps: PlannedSweep[] = [
  { path: 'pouches/reference-opening.csv', layout: 'preamble', role: 'reference', onTheBench: null, driftDb: 0, measuredAt: at('09:10') },
  { path: 'pouches/noise-generator-off.csv', layout: 'preamble', role: 'noise', onTheBench: null, driftDb: 0, measuredAt: at('09:25') },
  { path: 'pouches/enclosed-MP24-011-first-closure.csv', layout: 'decimal comma', role: 'enclosed', driftDb: -0.1, measuredAt: at('09:45'),
    onTheBench: onTheBench('MP24-011', asDelivered, leakyEnclosure(pouchM, 96, 0.000_22)) },
  { path: 'pouches/enclosed-MP24-011-second-closure.csv', layout: 'decimal comma', role: 'enclosed', driftDb: -0.12, measuredAt: at('09:55'),
    onTheBench: onTheBench('MP24-011', asDelivered, leakyEnclosure(pouchM, 96, 0.000_25)) },
  { path: 'pouches/enclosed-MP24-014-worn-seam.txt', layout: 'tab kHz dBµV', role: 'enclosed', driftDb: -0.2, measuredAt: at('10:15'),
    onTheBench: onTheBench('MP24-014', 'after 500 openings', leakyEnclosure(pouchM, 90, 0.001_2)) },
  { path: 'pouches/enclosed-MP25-003.csv', layout: 'UTF-16', role: 'enclosed', driftDb: -0.25, measuredAt: at('10:40'),
    onTheBench: onTheBench('MP25-003', asDelivered, leakyEnclosure(pouchM, 96, 0.000_31)) },
  { path: 'pouches/enclosed-SR-102-three-rolls.txt', layout: 'key: value', role: 'enclosed', driftDb: -0.3, measuredAt: at('11:05'),
    onTheBench: onTheBench('SR-102', 'rolled three times', leakyEnclosure(bagM, 92, 0.000_28)) },
  { path: 'pouches/enclosed-SR-102-one-roll.txt', layout: 'key: value', role: 'enclosed', driftDb: -0.32, measuredAt: at('11:15'),
    onTheBench: onTheBench('SR-102', 'rolled once', leakyEnclosure(bagM, 92, 0.002_4)) },
  { path: 'pouches/reference-closing.csv', layout: 'preamble', role: 'reference', onTheBench: null, driftDb: -0.4, measuredAt: at('11:30') },
];

/** A tracking generator from 30 MHz to 6 GHz; pouches of two lots and a roll-top bag. */
export const pouchDay: BenchDay = {
  seed: 1700, startHz: 3e7, stopHz: 6e9, points: 1601,
  settings: {
    rbwHz: 10_000, vbwHz: 30_000, detector: 'Positive Peak', traceMode: 'Max Hold', held: 20, inputAttenuationDb: 0, referenceLevelDbm: 0,
  },
  receiver: { noiseFigureDb: 21, inputAttenuationDb: 0, noiseSlopeDbPerSixGigahertz: 6 },
  chain: { levelDbm: -30, cableLossDbAtGigahertz: 7, antennaCornerHz: 6e7, rippleDb: 1.2, ripplePeriodHz: 1.1e8 },
  carrierStepHz: null, sweeps,
};
