import type { Requirement } from './curve-input.js';
import type { CurvePoints } from './curve-result.js';
import type { CurveRow } from './fold-repeats.js';
import { requiredAt } from './required-attenuation.js';

/**
 * Rows as parallel columns, rounded to float32 as they are kept.
 * @param rows the curve, by frequency.
 * @param requirement gives the required column; NaN elsewhere.
 */
export function pointsOf(rows: readonly CurveRow[], requirement: Requirement | null): CurvePoints {
  const column = (value: (row: CurveRow) => number): Float32Array => Float32Array.from(rows, value);
  return {
    frequencyHz: Float64Array.from(rows, (row) => row.frequencyHz), attenuationDb: column((row) => row.attenuationDb),
    atLeast: Uint8Array.from(rows, (row) => Number(row.atLeast)), atMostDb: column((row) => row.atMostDb), ceilingDb: column((row) => row.ceilingDb),
    expandedUncertaintyDb: column(() => NaN), requiredDb: column((row) => (requirement === null ? NaN : requiredAt(requirement, row.frequencyHz))),
    excessDb: column((row) => row.excessDb), referenceLevel: column((row) => row.referenceLevel), enclosedLevel: column((row) => row.enclosedLevel),
    floorLevel: column((row) => row.floorLevel), meanDb: column((row) => row.meanDb), spreadDb: column((row) => row.spreadDb),
    worstOf: Uint16Array.from(rows, (row) => row.worstOf),
  };
}
