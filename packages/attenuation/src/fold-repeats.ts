import { log10Of } from '@leeside/units/logarithm';
import type { Doubt } from '@leeside/trace-reading/transcription';
import type { PairReading, PairRow } from './read-pair.js';

/** One frequency of the curve, folded over everything that was read there. */
export interface CurveRow extends PairRow {
  readonly atMostDb: number;
  readonly meanDb: number;
  readonly spreadDb: number;
  readonly worstOf: number;
}

interface Candidate extends PairRow {
  readonly pairIndex: number;
}

/** Two sweeps cover the same band when they share four fifths of the wider one's span, over log frequency. */
const sameBandShare = 0.8;

function spanOfRows(rows: readonly PairRow[]): readonly [number, number] {
  const [first, last] = [rows[0]?.frequencyHz ?? NaN, rows.at(-1)?.frequencyHz ?? NaN];
  return [log10Of(Math.max(first, 1)), log10Of(Math.max(last, 1))];
}

function isSameBand(one: readonly PairRow[], other: readonly PairRow[]): boolean {
  const [a, b] = [spanOfRows(one), spanOfRows(other)];
  const wider = Math.max(a[1] - a[0], b[1] - b[0]);
  if (wider === 0) return a[0] === b[0];
  return Math.min(a[1], b[1]) - Math.max(a[0], b[0]) >= sameBandShare * wider;
}

/** Rows of one band merged by frequency; frequencies nearer than a hundredth of a step are one. */
function mergeBand(pairs: readonly { reading: PairReading; pairIndex: number }[]): Candidate[][] {
  const all = pairs.flatMap(({ reading, pairIndex }) => reading.rows.map((row): Candidate => ({ ...row, pairIndex })));
  all.sort((one, other) => one.frequencyHz - other.frequencyHz || one.pairIndex - other.pairIndex);
  const steps = pairs.map(({ reading }) => reading.stepHz).filter((step) => step > 0);
  const isComb = pairs.some(({ reading }) => reading.style !== 'continuous');
  const nearHz = steps.length === 0 ? 0 : Math.min(...steps) * (isComb ? 2 : 0.01);
  const groups: Candidate[][] = [];
  for (const row of all) {
    const group = groups.at(-1);
    const first = group?.[0];
    const isNear = first !== undefined && row.frequencyHz - first.frequencyHz <= nearHz;
    if (group && isNear && !group.some((other) => other.pairIndex === row.pairIndex)) group.push(row);
    else groups.push([row]);
  }
  return groups;
}

/**
 * The worst of repeats at one frequency: the lowest of all; where that is a bound, the lowest exact one is kept beside it as "at most".
 * Means are of exact values alone: bounds are never averaged with them.
 */
function worstOf(candidates: readonly Candidate[]): CurveRow {
  const worst = candidates.reduce((one, other) => (other.attenuationDb < one.attenuationDb ? other : one));
  const exact = candidates.filter((one) => !one.atLeast).map((one) => one.attenuationDb);
  const isAllExact = exact.length === candidates.length;
  const { pairIndex, ...row } = worst;
  return {
    ...row, worstOf: pairIndex,
    atMostDb: worst.atLeast && exact.length > 0 ? Math.min(...exact) : NaN,
    meanDb: isAllExact ? exact.reduce((sum, value) => sum + value, 0) / exact.length : NaN,
    spreadDb: exact.length > 1 ? Math.max(...exact) - Math.min(...exact) : NaN,
  };
}

const medianCeiling = (rows: readonly CurveRow[]): number => {
  const known = rows.map((row) => row.ceilingDb).filter(Number.isFinite).sort((one, other) => one - other);
  return known[known.length >> 1] ?? -Infinity;
};

/** One band, folded. */
interface FoldedBand {
  readonly rows: readonly CurveRow[];
  readonly lowHz: number;
  readonly highHz: number;
}

function foldedBand(rows: readonly CurveRow[]): FoldedBand {
  const frequencies = rows.map((row) => row.frequencyHz);
  return { rows, lowHz: frequencies[0] ?? Infinity, highHz: frequencies.at(-1) ?? -Infinity };
}

/** Whether another band has the higher ceiling over what both cover. */
function hasHigherCeiling(other: FoldedBand, own: FoldedBand): boolean {
  const [lowHz, highHz] = [Math.max(own.lowHz, other.lowHz), Math.min(own.highHz, other.highHz)];
  const shared = (band: FoldedBand): CurveRow[] => band.rows.filter((one) => one.frequencyHz >= lowHz && one.frequencyHz <= highHz);
  return medianCeiling(shared(other)) > medianCeiling(shared(own));
}

/** Joins bands: where two overlap, the one with the higher ceiling wins, the earlier one where they are equal. */
function joinBands(bands: readonly FoldedBand[]): { rows: CurveRow[]; seamsHz: number[] } {
  const rows: CurveRow[] = [];
  const seamsHz: number[] = [];
  bands.forEach((band, place) => {
    const others = bands.filter((other) => other !== band && other.highHz >= band.lowHz && other.lowHz <= band.highHz);
    const losesTo = others.filter((other) => hasHigherCeiling(other, band) || (bands.indexOf(other) < place && !hasHigherCeiling(band, other)));
    rows.push(...band.rows.filter((row) => !losesTo.some((other) => row.frequencyHz >= other.lowHz && row.frequencyHz <= other.highHz)));
    seamsHz.push(...losesTo.map((other) => (other.lowHz > band.lowHz ? other.lowHz : other.highHz)));
  });
  return { rows: rows.sort((one, other) => one.frequencyHz - other.frequencyHz), seamsHz };
}

/**
 * Folds everything read for one sample and condition into one curve: the worst of repeats within a band, bands joined.
 * @param readings pairs in time.
 * @returns rows by frequency, and a note for each seam.
 */
export function foldRepeats(readings: readonly PairReading[]): { rows: readonly CurveRow[]; doubts: Doubt[] } {
  const bands: { reading: PairReading; pairIndex: number }[][] = [];
  readings.forEach((reading, pairIndex) => {
    if (reading.rows.length === 0) return;
    const band = bands.find(([first]) => first !== undefined && isSameBand(first.reading.rows, reading.rows));
    if (band) band.push({ reading, pairIndex });
    else bands.push([{ reading, pairIndex }]);
  });
  const { rows, seamsHz } = joinBands(bands.map((band) => foldedBand(mergeBand(band).map(worstOf))));
  const doubts = seamsHz.map((seamHz): Doubt => ({ code: 'bands-joined', weight: 'note', message: `Two bands overlap and were joined at ${seamHz} Hz; where both were read, the one with the higher ceiling counts.` }));
  return { rows, doubts };
}
