import type { Doubt } from '@leeside/trace-reading/transcription';
import type { AnalysisParameters, TypedLevel } from './curve-input.js';
import type { PairReading, PairRow } from './read-pair.js';

/** Typed levels belong together when their frequencies agree to a millionth. */
export const sameTypedFrequency = 1e-6;
const isSame = (one: number, other: number): boolean => Math.abs(one - other) <= sameTypedFrequency * other;
const meanOf = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0) / values.length;

function referenceAround(enclosed: TypedLevel, references: readonly TypedLevel[]): { level: number; driftDb: number | null } | null {
  const here = references.filter((one) => isSame(one.frequencyHz, enclosed.frequencyHz));
  const before = here.findLast((one) => one.order < enclosed.order);
  const after = here.find((one) => one.order > enclosed.order);
  const used = [before, after].filter((one) => one !== undefined).map((one) => one.levelDbm);
  if (used.length === 0) return null;
  return { level: meanOf(used), driftDb: before && after ? after.levelDbm - before.levelDbm : null };
}

function rowOf(enclosed: TypedLevel, referenceLevel: number, noise: TypedLevel | undefined, marginDb: number): PairRow {
  const from = (level: number): number => referenceLevel - level;
  const thresholdDbm = noise === undefined ? NaN : noise.levelDbm + marginDb;
  const isUnder = enclosed.inTheNoise || enclosed.levelDbm < thresholdDbm;
  const boundDbm = enclosed.inTheNoise ? enclosed.levelDbm : isUnder ? thresholdDbm : enclosed.levelDbm;
  return {
    frequencyHz: enclosed.frequencyHz, attenuationDb: from(boundDbm), atLeast: isUnder,
    ceilingDb: enclosed.inTheNoise ? from(enclosed.levelDbm) : from(thresholdDbm), excessDb: 0,
    referenceLevel, enclosedLevel: enclosed.levelDbm, floorLevel: noise?.levelDbm ?? (enclosed.inTheNoise ? enclosed.levelDbm : NaN),
  };
}

/**
 * Pairs typed levels by frequency: reference before (and after) an enclosed one, a typed noise level as floor. One marked "in the noise"
 * bounds with the level typed.
 * @param levels typed levels of the curve and of its session.
 * @param parameters floor margin.
 * @returns a reading like that of a pair of sweeps, or null where nothing enclosed was typed.
 * @source common practice, no source: −31 dBm against −95 dBm in the noise is at least 64 dB.
 */
export function readTypedLevels(levels: readonly TypedLevel[], parameters: AnalysisParameters): PairReading | null {
  const sorted = [...levels].sort((one, other) => one.order - other.order);
  const of = (role: TypedLevel['role']): TypedLevel[] => sorted.filter((one) => one.role === role);
  const [references, noises, enclosed] = [of('reference'), of('noise'), of('enclosed')];
  if (enclosed.length === 0) return null;
  const rows: PairRow[] = [];
  const gaps: { frequencyHz: number; reason: 'no reference' }[] = [];
  let driftDb: number | null = null;
  for (const level of enclosed) {
    const reference = referenceAround(level, references);
    if (reference === null) {
      gaps.push({ frequencyHz: level.frequencyHz, reason: 'no reference' });
      continue;
    }
    if (reference.driftDb !== null && Math.abs(reference.driftDb) > Math.abs(driftDb ?? 0)) driftDb = reference.driftDb;
    rows.push(rowOf(level, reference.level, noises.findLast((one) => isSame(one.frequencyHz, level.frequencyHz)), parameters.floorMarginDb));
  }
  rows.sort((one, other) => one.frequencyHz - other.frequencyHz);
  const doubts: Doubt[] = [{ code: 'typed-levels', weight: 'note', message: 'Levels were read off the screen by eye and typed in.' }];
  return {
    pair: { enclosed: 'typed', reference: 'typed', closing: null, noise: null }, style: enclosed.length > 1 ? 'comb' : 'spot',
    floorSource: rows.some((row) => Number.isFinite(row.floorLevel)) ? 'typed' : 'none', rows, gaps, stepHz: 0, driftDb, doubts,
  };
}
