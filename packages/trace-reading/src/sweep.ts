import type { KeptLevelUnit } from '@leeside/units/level-unit';

/** Analyzer settings as far as a file tells them; an absent one is unknown. */
export interface SweepSettings {
  rbwHz?: number;
  vbwHz?: number;
  detector?: 'peak' | 'negative peak' | 'sample' | 'rms' | 'average' | 'quasi-peak' | 'auto';
  traceMode?: 'clear write' | 'max hold' | 'min hold' | 'average' | 'view';
  averaging?: 'power' | 'voltage' | 'log';
  /** Sweeps held or averaged. */
  held?: number;
  attenuationDb?: number;
  preamplifier?: boolean;
  referenceLevelDbm?: number;
  sweepTimeS?: number;
  impedanceOhm?: number;
  correctionsApplied?: boolean;
  instrument?: string;
  serial?: string;
}

/** Levels over frequency. Made by {@link makeSweep} alone, so that whoever holds one may trust it. */
export interface Sweep {
  /** Hz, strictly ascending, finite. */
  readonly frequencyHz: Float64Array;
  /** In `levelUnit`, finite, rounded to float32 before any analysis. */
  readonly level: Float32Array;
  readonly levelUnit: KeptLevelUnit;
  readonly settings: Readonly<SweepSettings>;
}

/** Where columns cannot be a sweep: which row, and why. */
export interface SweepFault {
  readonly row: number;
  readonly reason: 'empty' | 'lengths differ' | 'not finite' | 'not ascending';
}

function faultOf(frequencyHz: Float64Array, level: Float32Array): SweepFault | null {
  if (frequencyHz.length === 0) return { row: 0, reason: 'empty' };
  if (frequencyHz.length !== level.length) return { row: Math.min(frequencyHz.length, level.length), reason: 'lengths differ' };
  let before = -Infinity;
  for (let row = 0; row < frequencyHz.length; row += 1) {
    const frequency = frequencyHz[row] ?? NaN;
    if (!Number.isFinite(frequency) || !Number.isFinite(level[row])) return { row, reason: 'not finite' };
    if (frequency <= before) return { row, reason: 'not ascending' };
    before = frequency;
  }
  return null;
}

/**
 * The one maker of sweeps: checks at the door what everything behind it trusts.
 * @param columns frequencies in Hz and levels in `levelUnit`, of equal length ≥ 1, finite, frequencies strictly ascending.
 * @returns the sweep, or the first row that breaks a rule.
 * @example makeSweep({ frequencyHz: Float64Array.of(1e6, 2e6), level: Float32Array.of(-30, -31), levelUnit: 'dBm', settings: {} })
 */
export function makeSweep(columns: Sweep): { kind: 'sweep'; sweep: Sweep } | { kind: 'fault'; fault: SweepFault } {
  const fault = faultOf(columns.frequencyHz, columns.level);
  return fault === null ? { kind: 'sweep', sweep: { ...columns } } : { kind: 'fault', fault };
}
