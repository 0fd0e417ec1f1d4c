import { decibelsFromPowerRatio } from '@leeside/units/decibels';
import type { Doubt } from '@leeside/trace-reading/transcription';
import type { MeasuredSweep } from './curve-input.js';
import type { FloorSource } from './curve-result.js';
import { noiseFloorOf, type NoiseFloor } from './noise-floor.js';
import { largestOfNoiseDb } from './noise-statistics.js';
import { pairNoise } from './pair-sweeps.js';

/** Where the floor of a sweep comes from, and what was done to it. */
export interface FoundFloor {
  readonly source: FloorSource;
  readonly floor: NoiseFloor | null;
  readonly noiseTraceId: string | null;
  readonly doubts: readonly Doubt[];
}

const moved = (floor: NoiseFloor, byDb: number, looks = floor.looks): NoiseFloor =>
  ({ ...floor, medianLevel: floor.medianLevel.map((level) => level + byDb), looks });

function moveByBandwidth(floor: NoiseFloor, noise: MeasuredSweep, measured: MeasuredSweep): { floor: NoiseFloor; doubts: Doubt[] } {
  const from = noise.sweep.settings.rbwHz;
  const to = measured.sweep.settings.rbwHz;
  if (from === undefined || to === undefined || from === to) return { floor, doubts: [] };
  const byDb = decibelsFromPowerRatio(to / from);
  const message = `The noise sweep was taken with an RBW of ${from} Hz, the reading with ${to} Hz: its floor was moved by ${byDb.toFixed(1)} dB.`;
  return { floor: moved(floor, byDb), doubts: [{ code: 'noise-rbw-differs', weight: 'doubt', message }] };
}

function moveByHolding(floor: NoiseFloor, noise: MeasuredSweep, measured: MeasuredSweep): { floor: NoiseFloor; doubts: Doubt[] } {
  const from = noise.sweep.settings.held;
  const to = measured.sweep.settings.held;
  if (measured.sweep.settings.traceMode !== 'max hold' || from === to) return { floor, doubts: [] };
  if (from === undefined || to === undefined) {
    const message = `How many sweeps were held is known for only one of noise and reading (${from ?? 'unknown'} and ${to ?? 'unknown'}): taken as equal.`;
    return { floor, doubts: [{ code: 'noise-held-unknown', weight: 'doubt', message }] };
  }
  const byDb = largestOfNoiseDb(0.5, to) - largestOfNoiseDb(0.5, from);
  const message = `The noise was held over ${from} sweeps, the reading over ${to}: its floor was moved by ${byDb.toFixed(1)} dB.`;
  return { floor: moved(floor, byDb, to), doubts: [{ code: 'noise-held-differs', weight: 'doubt', message }] };
}

function preampDoubts(noise: MeasuredSweep, measured: MeasuredSweep): Doubt[] {
  const [one, other] = [noise.sweep.settings, measured.sweep.settings];
  const differs = (a: unknown, b: unknown): boolean => a !== undefined && b !== undefined && a !== b;
  if (!differs(one.attenuationDb, other.attenuationDb) && !differs(one.preamplifier, other.preamplifier)) return [];
  return [{ code: 'noise-input-differs', weight: 'doubt', message: 'Input attenuation or preamplifier of the noise sweep differ from the reading’s: its floor may not be the reading’s.' }];
}

const known = new WeakMap<Float32Array, NoiseFloor>();

/** The floor of a noise sweep, worked out once for all the readings of a session that share it. */
function floorOfNoise({ sweep }: MeasuredSweep): NoiseFloor | null {
  const floor = known.get(sweep.level) ?? noiseFloorOf(sweep.frequencyHz, sweep.level);
  if (floor !== null) known.set(sweep.level, floor);
  return floor;
}

/**
 * The floor of a reading, the best source first: a noise sweep that fits; the reading itself beside its carriers; none.
 * @param measured the sweep whose floor is sought.
 * @param noises noise sweeps of the session.
 * @param ownFloor floor of the sweep beside its carriers, null where it has none.
 */
export function findFloor(measured: MeasuredSweep, noises: readonly MeasuredSweep[], ownFloor: NoiseFloor | null): FoundFloor {
  const noise = pairNoise(measured, noises);
  const floor = noise === null ? null : floorOfNoise(noise);
  if (noise === null || floor === null) return { source: ownFloor === null ? 'none' : 'beside the carriers', floor: ownFloor, noiseTraceId: null, doubts: [] };
  const byBandwidth = moveByBandwidth(floor, noise, measured);
  const byHolding = moveByHolding(byBandwidth.floor, noise, measured);
  return {
    source: 'noise sweep', floor: byHolding.floor, noiseTraceId: noise.traceId,
    doubts: [...byBandwidth.doubts, ...byHolding.doubts, ...preampDoubts(noise, measured)],
  };
}
