import { decibelsFromPowerRatio, powerRatioFromDecibels } from '@leeside/units/decibels';

/** Steady carriers: where and how strong. */
export interface Carriers {
  readonly frequencyHz: Float64Array;
  readonly levelDbm: Float64Array;
}

/** A Gaussian filter is 3 dB down at half its bandwidth, and its flank is cut off where nothing is left of it. */
const deepestFlankDb = 150;

/** Loss of a carrier so far from the nearest edge of a display point. The peak detector takes the best moment within the point. */
function flankDb(distanceHz: number, rbwHz: number): number {
  return 3.0103 * ((2 * distanceHz) / rbwHz) ** 2;
}

/**
 * What each display point sees of the carriers: a swept Gaussian RBW filter and a peak detector, so that a carrier shows at its full level
 * in the point that it falls into, and on the filter's flanks beside it.
 * @param axisHz display points, evenly spaced, Hz.
 * @param rbwHz 3 dB bandwidth, Hz.
 * @returns dBm at each point; −Infinity where no carrier reaches.
 */
export function carrierResponseDbm(carriers: Carriers, axisHz: Float64Array, rbwHz: number): Float64Array {
  const startHz = axisHz[0] ?? 0;
  const stepHz = ((axisHz.at(-1) ?? 0) - startHz) / Math.max(1, axisHz.length - 1);
  const reachPoints = Math.ceil((rbwHz * Math.sqrt(deepestFlankDb / 3.0103)) / 2 / stepHz) + 1;
  const powerMw = new Float64Array(axisHz.length);
  carriers.frequencyHz.forEach((carrierHz, index) => {
    const nearest = Math.round((carrierHz - startHz) / stepHz);
    const from = Math.max(0, nearest - reachPoints);
    for (let point = from; point <= Math.min(axisHz.length - 1, nearest + reachPoints); point += 1) {
      const distanceHz = Math.max(0, Math.abs((axisHz[point] ?? 0) - carrierHz) - stepHz / 2);
      const lossDb = flankDb(distanceHz, rbwHz);
      if (lossDb > deepestFlankDb) continue;
      powerMw[point] = (powerMw[point] ?? 0) + powerRatioFromDecibels((carriers.levelDbm[index] ?? -Infinity) - lossDb);
    }
  });
  return powerMw.map(decibelsFromPowerRatio);
}
