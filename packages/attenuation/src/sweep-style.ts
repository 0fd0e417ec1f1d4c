import { valueAt } from '@leeside/units/value-at';
import type { Sweep } from '@leeside/trace-reading/sweep';
import { carrierOverThresholdDb, findCarriers, floorBesideCarriers } from './carriers.js';
import { medianStepHz } from './axis-search.js';
import { floorAt, floorWindowBins, noiseFloorOf, type NoiseFloor } from './noise-floor.js';

/** How a reference was swept, with its carriers and the floor that was used to tell. */
export interface SweepStyle {
  readonly style: 'spot' | 'comb' | 'continuous';
  /** Frequencies of the carriers, Hz, ascending; empty for a continuous sweep. */
  readonly carrierHz: readonly number[];
  /** Floor of the sweep itself beside its carriers; null for a continuous one. */
  readonly ownFloor: NoiseFloor | null;
}

/** A window in which a carrier is a small part, however many bins its RBW covers. */
function roughWindowBins(sweep: Sweep): number {
  const stepHz = medianStepHz(sweep.frequencyHz);
  const binsOfRbw = stepHz > 0 ? (sweep.settings.rbwHz ?? 0) / stepHz : 0;
  return Math.max(floorWindowBins, Math.ceil(windowRbws * binsOfRbw));
}

const windowRbws = 20;

function isSignalThroughout(sweep: Sweep, noise: NoiseFloor, marginDb: number): boolean {
  let strong = 0;
  for (let bin = 0; bin < sweep.level.length; bin += 1) {
    const { thresholdLevel } = floorAt(noise, valueAt(sweep.frequencyHz, bin), marginDb, 1);
    if (valueAt(sweep.level, bin) >= thresholdLevel + carrierOverThresholdDb) strong += 1;
  }
  return strong * 2 >= sweep.level.length;
}

/**
 * Tells spot, comb and continuous sweeps apart: continuous if half of the bins or more stand 10 dB or more above the threshold, or if
 * nothing in it is a carrier; otherwise spot with one carrier, comb with two or more.
 * @param sweep a reference.
 * @param noise floor of a noise sweep with the same settings, or null.
 * @param marginDb floor margin, dB.
 */
export function sweepStyle(sweep: Sweep, noise: NoiseFloor | null, marginDb = 6): SweepStyle {
  const continuous: SweepStyle = { style: 'continuous', carrierHz: [], ownFloor: null };
  if (noise !== null && isSignalThroughout(sweep, noise, marginDb)) return continuous;
  const rough = noise ?? noiseFloorOf(sweep.frequencyHz, sweep.level, roughWindowBins(sweep));
  if (rough === null) return continuous;
  const frequencyOf = (bin: number): number => valueAt(sweep.frequencyHz, bin);
  const first = findCarriers(sweep, rough, marginDb).map(frequencyOf);
  if (first.length === 0) return continuous;
  const ownFloor = floorBesideCarriers(sweep, first);
  const carrierHz = ownFloor === null ? first : findCarriers(sweep, ownFloor, marginDb).map(frequencyOf);
  if (carrierHz.length === 0) return continuous;
  return { style: carrierHz.length === 1 ? 'spot' : 'comb', carrierHz, ownFloor };
}
