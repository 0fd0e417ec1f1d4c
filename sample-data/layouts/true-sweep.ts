import { levelDbmFrom, type AbsoluteLevelUnit, type KeptLevelUnit } from '@leeside/units/level-unit';

/** What an invented sweep truly is: the axis in Hz and the levels as they must be kept, before rounding to float32. */
export interface TrueSweep {
  readonly unit: KeptLevelUnit;
  readonly frequencyHz: readonly number[];
  readonly level: readonly number[];
}

/** Equal steps of whole hertz. */
export function axisHz(startHz: number, stepHz: number, count: number): number[] {
  return Array.from({ length: count }, (_, at) => startHz + at * stepHz);
}

/** Invented levels in hundredths, from −90 up to −50, the same at every run. */
export function levels(count: number, seed = 1): number[] {
  return Array.from({ length: count }, (_, at) => -9000 + (((at + seed) * 7919) % 4001)).map((hundredths) => hundredths / 100);
}

/** Levels that a file states in an absolute unit, as they must be kept. */
export function kept(values: readonly number[], unit: AbsoluteLevelUnit, impedanceOhm = 50): number[] {
  return values.map((value) => levelDbmFrom(value, unit, impedanceOhm));
}

/** A sweep in dBm. */
export function dbmSweep(frequencyHz: readonly number[], level: readonly number[]): TrueSweep {
  return { unit: 'dBm', frequencyHz, level };
}

const shifts = { Hz: 0, kHz: 3, MHz: 6, GHz: 9 } as const;

/** Whole hertz written in a larger unit without any rounding: 433920000 as "433.92". */
export function written(hz: number, unit: keyof typeof shifts, mark: '.' | ',' = '.'): string {
  const shift = shifts[unit];
  if (shift === 0) return String(hz);
  const digits = String(hz).padStart(shift + 1, '0');
  return `${digits.slice(0, -shift)}${mark}${digits.slice(-shift)}`.replace(/[.,]?0+$/, '');
}

/** A level as people write it, with a chosen decimal mark. */
export function withMark(value: number, mark: '.' | ',' = '.', decimals = 2): string {
  return value.toFixed(decimals).replace('.', mark);
}
