import { decibelsFromPowerRatio } from '@leeside/units/decibels';
import { log10Of } from '@leeside/units/logarithm';

/**
 * Quantile of the largest of n independent noise powers, relative to the mean noise power: −ln(1 − q^(1/n)), equation (1).
 * @param quantile q, 0 < q < 1.
 * @param looks n, the number of independent looks, ≥ 1 (fractions allowed).
 * @returns dB over the mean noise power.
 * @source closed form of the largest of n exponential variables (computed; n = 10: median 4.32 dB, 99 % 8.39 dB).
 * @example largestOfNoiseDb(0.5, 1) // −1.59
 */
export function largestOfNoiseDb(quantile: number, looks: number): number {
  return decibelsFromPowerRatio(-Math.log(-Math.expm1(Math.log(quantile) / looks)));
}

const quartileSpreadDb = (looks: number): number => largestOfNoiseDb(0.75, looks) - largestOfNoiseDb(0.25, looks);
const mostLooks = 10_000;

/**
 * The number of looks whose noise would scatter as much as observed, by the distance of the quartiles.
 * @param spreadDb third quartile less first quartile of the levels about their running median, dB.
 * @returns looks between 1 and 10,000; averaged traces, which scatter less than any held one, give 10,000.
 * @example looksFromSpread(6.83) // about 1
 */
export function looksFromSpread(spreadDb: number): number {
  if (spreadDb >= quartileSpreadDb(1)) return 1;
  if (spreadDb <= quartileSpreadDb(mostLooks)) return mostLooks;
  let low = 0;
  let high = Math.log(mostLooks);
  for (let step = 0; step < 50; step += 1) {
    const middle = (low + high) / 2;
    if (quartileSpreadDb(Math.exp(middle)) > spreadDb) low = middle;
    else high = middle;
  }
  return Math.exp((low + high) / 2);
}

/**
 * How far below the detection threshold a signal that stands at it can read, at 5 % risk (a).
 * @param looks independent looks of the enclosed reading.
 * @returns dB added to the threshold before it bounds.
 * @source computed for a carrier in Gaussian noise: 3.5, 1.6, 0.5 and 0 dB for 1, 2, 3 and 5 or more looks.
 */
export function allowanceAtThresholdDb(looks: number): number {
  if (looks < 1.7) return 3.5;
  if (looks < 2.7) return 1.6;
  return looks < 4.7 ? 0.5 : 0;
}

const signalToNoiseDb = [0, 6, 10, 20, 30] as const;
/** Median over-reading of a held carrier, dB, by looks (1, 10, 100, 1000) and S/N. */
const overReadingDb: readonly (readonly number[])[] = [
  [1.894, 0.524, 0.214, 0.022, 0.002],
  [6.962, 3.98, 2.649, 0.894, 0.288],
  [9.204, 5.655, 3.92, 1.411, 0.467],
  [10.608, 6.75, 4.78, 1.786, 0.602],
];

function alongSignal(row: readonly number[], snrDb: number): number {
  const clamped = Math.min(Math.max(snrDb, 0), 30);
  const at = Math.min(signalToNoiseDb.findLastIndex((value) => value <= clamped), signalToNoiseDb.length - 2);
  const from = signalToNoiseDb[at] ?? 0;
  const to = signalToNoiseDb[at + 1] ?? 30;
  const share = (clamped - from) / (to - from);
  return (row[at] ?? 0) * (1 - share) + (row[at + 1] ?? 0) * share;
}

/**
 * By how much the noise lifts the reading of a carrier that is held over n looks: the excess, equation (7).
 * @param readingOverNoiseDb reading less mean noise power, dB.
 * @param looks looks held.
 * @returns dB, between 0 and 4 near the threshold for many looks.
 * @source median of the largest of n non-central χ² variables with two degrees of freedom (computed).
 */
export function excessDb(readingOverNoiseDb: number, looks: number): number {
  const decade = Math.min(Math.max(log10Of(looks), 0), 3);
  const lower = Math.min(Math.floor(decade), 2);
  const share = decade - lower;
  const at = (snrDb: number): number =>
    alongSignal(overReadingDb[lower] ?? [], snrDb) * (1 - share) + alongSignal(overReadingDb[lower + 1] ?? [], snrDb) * share;
  let excess = 0;
  for (let round = 0; round < 20; round += 1) excess = (excess + at(readingOverNoiseDb - excess)) / 2;
  return Math.min(excess, Math.max(readingOverNoiseDb, 0));
}
