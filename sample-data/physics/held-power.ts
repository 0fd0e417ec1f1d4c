import type { RandomSource } from './random-source.js';

/** What one display point of an analyzer meets during a sweep. Powers in one linear unit (mW). */
export interface PointPowers {
  readonly signalMw: number;
  /** Mean power of the noise in the RBW. */
  readonly noiseMw: number;
}

/**
 * One look: a carrier of fixed power with complex Gaussian noise on top, both through the RBW.
 * @returns the power seen, mW; without a carrier exponentially distributed with mean `noiseMw`.
 */
export function onePower({ signalMw, noiseMw }: PointPowers, random: RandomSource): number {
  const sigma = Math.sqrt(noiseMw / 2);
  const inPhase = Math.sqrt(signalMw) + sigma * random.gaussian();
  const quadrature = sigma * random.gaussian();
  return inPhase * inPhase + quadrature * quadrature;
}

/** Max hold: the largest power of so many independent looks, mW. */
export function heldPower(point: PointPowers, looks: number, random: RandomSource): number {
  let largest = 0;
  for (let look = 0; look < looks; look += 1) largest = Math.max(largest, onePower(point, random));
  return largest;
}

/** Power averaging (RMS): the mean power of so many independent looks, mW. */
export function averagedPower(point: PointPowers, looks: number, random: RandomSource): number {
  let sum = 0;
  for (let look = 0; look < looks; look += 1) sum += onePower(point, random);
  return sum / looks;
}
