import { log10Of, powerOfTen } from '@leeside/units/logarithm';
import { censoredQuantile } from './censored-quantile.js';
import type { Requirement } from './curve-input.js';
import type { Band, Lowest } from './curve-result.js';
import type { CurveRow } from './fold-repeats.js';
import { theilSenSlope } from './theil-sen.js';

/**
 * The lowest attenuation of a stretch; among equals the first.
 * @param rows rows of the curve.
 * @returns null without rows.
 */
export function lowestOf(rows: readonly CurveRow[]): Lowest | null {
  let lowest: CurveRow | null = null;
  for (const row of rows) if (lowest === null || row.attenuationDb < lowest.attenuationDb) lowest = row;
  if (lowest === null) return null;
  const atMostDb = lowest.atLeast ? lowestExact(rows) : null;
  return { frequencyHz: lowest.frequencyHz, attenuationDb: lowest.attenuationDb, atLeast: lowest.atLeast, atMostDb };
}

/** The lowest exact value of a stretch: where the lowest of all is a bound, the true lowest is at most this. */
function lowestExact(rows: readonly CurveRow[]): number | null {
  let least = Infinity;
  for (const row of rows) {
    const exact = row.atLeast ? row.atMostDb : row.attenuationDb;
    if (exact < least) least = exact;
  }
  return Number.isFinite(least) ? least : null;
}

interface Stretch {
  readonly fromHz: number;
  readonly toHz: number;
  readonly kind: Band['kind'];
}

function stretchesOf(rows: readonly CurveRow[], requirement: Requirement | null): Stretch[] {
  const first = rows[0]?.frequencyHz ?? 0;
  const last = rows.at(-1)?.frequencyHz ?? 0;
  const stretches: Stretch[] = (requirement?.segments ?? []).map(({ fromHz, toHz }) => ({ fromHz, toHz, kind: 'segment' }));
  if (first <= 0) return stretches;
  for (let decade = Math.floor(log10Of(first) + 1e-12); powerOfTen(decade) <= last; decade += 1) {
    stretches.push({ fromHz: powerOfTen(decade), toHz: powerOfTen(decade + 1), kind: 'decade' });
  }
  return stretches;
}

function bandOf(stretch: Stretch, rows: readonly CurveRow[]): Band {
  const values = rows.map((row) => ({ value: row.attenuationDb, atLeast: row.atLeast }));
  const exact = rows.filter((row) => !row.atLeast);
  const median = censoredQuantile(values, 0.5);
  const q10 = censoredQuantile(values, 0.1);
  return {
    ...stretch, lowest: lowestOf(rows), medianDb: median?.value ?? null, medianAtLeast: median?.atLeast ?? false,
    q10Db: q10?.value ?? null, q10AtLeast: q10?.atLeast ?? false,
    boundShare: rows.length === 0 ? 0 : (rows.length - exact.length) / rows.length,
    slopeDbPerDecade: theilSenSlope(exact.map((row) => log10Of(row.frequencyHz)), exact.map((row) => row.attenuationDb)),
  };
}

/**
 * Lowest, median, 10 % quantile, share of bounds and slope per segment of the requirement and per decade that holds readings. A decade
 * includes its lower end; a segment both.
 * @param rows the curve.
 * @param requirement null leaves decades alone.
 */
export function bandsOf(rows: readonly CurveRow[], requirement: Requirement | null): Band[] {
  return stretchesOf(rows, requirement).map((stretch) => {
    const isIn = (frequencyHz: number): boolean =>
      frequencyHz >= stretch.fromHz && (stretch.kind === 'segment' ? frequencyHz <= stretch.toHz : frequencyHz < stretch.toHz);
    return bandOf(stretch, rows.filter((row) => isIn(row.frequencyHz)));
  }).filter((band) => band.kind === 'segment' || band.lowest !== null);
}
