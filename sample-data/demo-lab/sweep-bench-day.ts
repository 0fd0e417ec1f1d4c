import { carrierResponseDbm } from '../physics/carrier-response.js';
import { enclosureAttenuationDb } from '../physics/enclosure.js';
import { frequencyAxisHz } from '../physics/frequency-axis.js';
import { randomSource } from '../physics/random-source.js';
import { meanNoiseDbm } from '../physics/receiver-noise.js';
import { simulateSweep } from '../physics/simulate-sweep.js';
import { openLevelDbm } from '../physics/transmit-chain.js';
import { traceBytes } from '../writing/trace-bytes.js';
import type { BenchDay, PlannedSweep } from './bench-day.js';

function arrivingDbm(day: BenchDay, sweep: PlannedSweep, frequencyHz: Float64Array): Float64Array {
  const openDbm = openLevelDbm(day.chain, frequencyHz);
  const attenuationDb = sweep.onTheBench === null ? null : enclosureAttenuationDb(sweep.onTheBench.enclosure, frequencyHz);
  return openDbm.map((levelDbm, point) => levelDbm + sweep.driftDb - (attenuationDb?.[point] ?? 0));
}

function signalDbm(day: BenchDay, sweep: PlannedSweep, axisHz: Float64Array): Float64Array {
  if (sweep.role === 'noise') return axisHz.map(() => -Infinity);
  const stepHz = day.carrierStepHz;
  if (stepHz === null) return arrivingDbm(day, sweep, axisHz);
  const count = Math.floor(day.stopHz / stepHz) - Math.ceil(day.startHz / stepHz) + 1;
  const frequencyHz = Float64Array.from({ length: count }, (_, index) => (Math.ceil(day.startHz / stepHz) + index) * stepHz);
  return carrierResponseDbm({ frequencyHz, levelDbm: arrivingDbm(day, sweep, frequencyHz) }, axisHz, day.settings.rbwHz);
}

/** The bytes of every file of a bench day, by path. */
export function sweepBenchDay(day: BenchDay): Map<string, Uint8Array> {
  const axisHz = frequencyAxisHz(day.startHz, day.stopHz, day.points);
  const noiseDbm = meanNoiseDbm(day.receiver, day.settings.rbwHz, axisHz);
  return new Map(day.sweeps.map((sweep, order) => {
    const levelDbm = simulateSweep(
      { signalDbm: signalDbm(day, sweep, axisHz), noiseDbm, looks: day.settings.held, combined: 'held', quantumDb: 0.01 },
      randomSource(day.seed + order),
    );
    const trace = { frequencyHz: axisHz, levelDbm, settings: day.settings, takenAt: sweep.measuredAt.slice(0, 19) };
    return [sweep.path, traceBytes(trace, sweep.layout)];
  }));
}
