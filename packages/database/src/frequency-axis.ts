import { packFloat64, unpackFloat64 } from './numeric-columns.js';

/** A frequency axis as it is kept: start and step where that gives every frequency back to the last bit, else all of them. */
export interface KeptAxis {
  readonly startHz: number;
  readonly stepHz: number | null;
  readonly frequencyF64: Buffer | null;
}

/** Keeps an axis in the shortest form that loses nothing. */
export function keepAxis(frequencyHz: Float64Array): KeptAxis {
  const startHz = frequencyHz[0] ?? 0;
  const last = frequencyHz.length - 1;
  const stepHz = last > 0 ? ((frequencyHz[last] ?? 0) - startHz) / last : 1;
  const isExact = frequencyHz.every((frequency, at) => startHz + at * stepHz === frequency);
  return isExact ? { startHz, stepHz, frequencyF64: null } : { startHz, stepHz: null, frequencyF64: packFloat64(frequencyHz) };
}

/** The axis as it was given. */
export function restoreAxis(axis: KeptAxis, pointCount: number): Float64Array {
  if (axis.frequencyF64 !== null) return unpackFloat64(axis.frequencyF64);
  const stepHz = axis.stepHz ?? 0;
  return Float64Array.from({ length: pointCount }, (_, at) => axis.startHz + at * stepHz);
}
