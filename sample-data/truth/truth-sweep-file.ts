import { randomSource } from '../physics/random-source.js';
import { simulateSweep } from '../physics/simulate-sweep.js';
import { traceBytes } from '../writing/trace-bytes.js';
import type { TruthFile, TruthOptions } from './truth-set.js';

/** One sweep about to become a file. */
export interface TruthSweep {
  readonly name: string;
  readonly role: TruthFile['role'];
  readonly axisHz: Float64Array;
  readonly signalDbm: Float64Array;
  readonly noiseDbm: Float64Array;
  /** Minutes after nine o'clock. */
  readonly minute: number;
  readonly seed: number;
}

const settingsOf = (options: TruthOptions, looks: number) => ({
  rbwHz: options.rbwHz, vbwHz: options.rbwHz * 3, held: looks, inputAttenuationDb: 0, referenceLevelDbm: 10,
  ...(options.combined === 'held'
    ? { detector: 'Positive Peak', traceMode: 'Max Hold' } as const
    : { detector: 'RMS', traceMode: 'Average' } as const),
});

const twoDigits = (value: number): string => value.toString().padStart(2, '0');

/** Simulates the sweep with the looks of its role and writes it in the layout of the set. */
export function truthSweepFile(options: TruthOptions, sweep: TruthSweep): TruthFile {
  const looks = options.looks[sweep.role];
  const levelDbm = simulateSweep(
    { signalDbm: sweep.signalDbm, noiseDbm: sweep.noiseDbm, looks, combined: options.combined, quantumDb: options.quantumDb },
    randomSource(sweep.seed),
  );
  const takenAt = `2026-11-10T${twoDigits(9 + Math.floor(sweep.minute / 60))}:${twoDigits(sweep.minute % 60)}:00`;
  const settings = options.settingsWritten ? settingsOf(options, looks) : null;
  return {
    name: sweep.name, role: sweep.role, measuredAt: `${takenAt}Z`,
    bytes: traceBytes({ frequencyHz: sweep.axisHz, levelDbm, settings, takenAt }, options.layout),
  };
}
