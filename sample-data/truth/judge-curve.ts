import { maxHoldExcessDb } from './max-hold-excess.js';
import type { Truth } from './truth-set.js';

/** A curve as the program gives it; parallel arrays, ascending in frequency. `attenuationDb` is the bound where `atLeast`. */
export interface CurveToJudge {
  readonly frequencyHz: ArrayLike<number>;
  readonly attenuationDb: ArrayLike<number>;
  readonly atLeast: ArrayLike<boolean | number>;
}

/** One gate: how many of those concerned pass, and how large a share must. */
export interface Gate {
  readonly name: string;
  readonly passed: number;
  readonly of: number;
  readonly neededShare: number;
}

/** A point of the curve beside what is true there. */
interface JudgedPoint {
  readonly errorDb: number;
  readonly isBound: boolean;
  readonly overNoiseDb: number;
  /** The bound over the highest attenuation that true reference and mean noise allow, dB. */
  readonly overCeilingDb: number;
}

/** True where a gate holds; a gate that concerns nothing holds. */
export const gateHolds = ({ passed, of, neededShare }: Gate): boolean => of === 0 || passed / of >= neededShare;

const overNoiseDb = (truth: Truth, at: number): number => (truth.enclosedSignalDbm[at] ?? 0) - (truth.meanNoiseDbm[at] ?? 0);
const openOverNoiseDb = (truth: Truth, at: number): number => (truth.referenceLevelDbm[at] ?? 0) - (truth.meanNoiseDbm[at] ?? 0);

function nearestOf(frequencyHz: ArrayLike<number>, atHz: number): number {
  let low = 0;
  let high = frequencyHz.length - 1;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((frequencyHz[middle] ?? 0) < atHz) low = middle + 1;
    else high = middle;
  }
  return low > 0 && atHz - (frequencyHz[low - 1] ?? 0) < (frequencyHz[low] ?? 0) - atHz ? low - 1 : low;
}

function isNear(frequencyHz: ArrayLike<number>, atHz: number, toleranceHz: number): boolean {
  return frequencyHz.length > 0 && Math.abs((frequencyHz[nearestOf(frequencyHz, atHz)] ?? 0) - atHz) <= toleranceHz;
}

function judgedPoints(curve: CurveToJudge, truth: Truth): JudgedPoint[] {
  return Array.from(curve.frequencyHz).flatMap((atHz, point) => {
    if (!isNear(truth.frequencyHz, atHz, truth.toleranceHz)) return [];
    const at = nearestOf(truth.frequencyHz, atHz);
    const attenuationDb = curve.attenuationDb[point] ?? NaN;
    return [{
      errorDb: attenuationDb - (truth.trueAttenuationDb[at] ?? 0), isBound: Boolean(curve.atLeast[point]),
      overNoiseDb: overNoiseDb(truth, at), overCeilingDb: attenuationDb - openOverNoiseDb(truth, at),
    }];
  });
}

function gateOf<Judged>(name: string, neededShare: number, concerned: readonly Judged[], passes: (judged: Judged) => boolean): Gate {
  return { name, neededShare, of: concerned.length, passed: concerned.filter(passes).length };
}

/**
 * Judges a curve by what is true: does everything appear that can, are exact values right, bounds honest and tight, and noise called noise.
 * A point that is not a number passes no gate.
 * @returns six gates; the last three concern nothing where no file shows the noise and there are no bounds.
 */
export function judgeCurve(curve: CurveToJudge, truth: Truth): Gate[] {
  const points = judgedPoints(curve, truth);
  const strong = Array.from(truth.frequencyHz).filter((_, at) => openOverNoiseDb(truth, at) >= 20);
  const bounds = points.filter((point) => point.isBound);
  const allowedDb = (point: JudgedPoint): number => 1.5 + maxHoldExcessDb(point.overNoiseDb, truth.heldLooks);
  return [
    gateOf('carriers with a reference 20 dB over the noise appear', 0.98, strong, (atHz) => isNear(curve.frequencyHz, atHz, truth.toleranceHz)),
    gateOf('25 dB over the noise: exact and within 1.5 dB', 0.99, points.filter((point) => point.overNoiseDb >= 25),
      (point) => !point.isBound && Math.abs(point.errorDb) <= 1.5),
    gateOf('12 to 25 dB over the noise: exact and within 1.5 dB plus excess', 0.9,
      points.filter((point) => point.overNoiseDb >= 12 && point.overNoiseDb < 25),
      (point) => !point.isBound && Math.abs(point.errorDb) <= allowedDb(point)),
    gateOf('bounds are not above the truth + 1 dB', 0.99, bounds, (point) => point.errorDb <= 1),
    gateOf('bounds are not more than 16 dB under reference less noise', 0.95, bounds, (point) => point.overCeilingDb >= -16),
    gateOf('3 dB or more under the noise: a bound', 0.97,
      truth.floorKnown ? points.filter((point) => point.overNoiseDb <= -3) : [], (point) => point.isBound),
  ];
}

/** The same gates over several curves together. */
export function pooledGates(judgements: readonly (readonly Gate[])[]): Gate[] {
  return (judgements[0] ?? []).map((first, at) => judgements.slice(1).reduce<Gate>((sum, other) => ({
    ...sum, passed: sum.passed + (other[at]?.passed ?? 0), of: sum.of + (other[at]?.of ?? 0),
  }), first));
}
