import type { Doubt } from '@leeside/trace-reading/transcription';
import { medianStepHz, nearestIndex } from './axis-search.js';
import { binsAround, carrierToleranceHz, highestBin, carrierOverThresholdDb } from './carriers.js';
import type { MeasuredSweep } from './curve-input.js';
import type { FloorSource, GapReason, Pair } from './curve-result.js';
import type { FoundFloor } from './floor-source.js';
import { interpolateLevel } from './interpolate-level.js';
import { floorAt, type FloorLevel } from './noise-floor.js';
import { attenuationOf } from './reading-points.js';
import { spanOf, type ReferencePair } from './pair-sweeps.js';
import type { SweepStyle } from './sweep-style.js';

/** One enclosed sweep read against its reference; a row a frequency, in growing order. */
export interface PairReading {
  readonly pair: Pair;
  readonly style: SweepStyle['style'];
  readonly floorSource: FloorSource;
  readonly rows: readonly PairRow[];
  readonly gaps: readonly { frequencyHz: number; reason: GapReason }[];
  readonly stepHz: number;
  readonly driftDb: number | null;
  readonly doubts: readonly Doubt[];
}

export interface PairRow {
  readonly frequencyHz: number;
  readonly attenuationDb: number;
  readonly atLeast: boolean;
  readonly ceilingDb: number;
  readonly excessDb: number;
  readonly referenceLevel: number;
  readonly enclosedLevel: number;
  readonly floorLevel: number;
}

/** What belongs together when one enclosed sweep is read. */
export interface PairToRead {
  readonly enclosed: MeasuredSweep;
  readonly references: ReferencePair;
  readonly style: SweepStyle;
  readonly enclosedFloor: FoundFloor;
  readonly referenceFloor: FoundFloor;
  readonly leakage: MeasuredSweep | null;
  readonly floorMarginDb: number;
}

type LevelAt = (frequencyHz: number) => number;

/** Level of a sweep at a frequency in the manner of its style: the highest near a carrier, or interpolated. */
function levelReader(measured: MeasuredSweep, style: SweepStyle['style']): LevelAt {
  const { sweep } = measured;
  if (style === 'continuous') {
    const widestHz = Math.max(2 * medianStepHz(sweep.frequencyHz), sweep.settings.rbwHz ?? 0) * (1 + 1e-9);
    return (frequencyHz) => interpolateLevel(sweep.frequencyHz, sweep.level, frequencyHz, widestHz);
  }
  const toleranceHz = carrierToleranceHz(sweep);
  return (frequencyHz) => {
    const bin = highestBin(sweep, frequencyHz, toleranceHz);
    return bin < 0 ? NaN : (sweep.level[bin] ?? NaN);
  };
}

function floorReader(found: FoundFloor, marginDb: number, binsRead: number): (frequencyHz: number) => FloorLevel | null {
  const { floor } = found;
  if (floor === null) return () => null;
  const axis = floor.frequencyHz;
  const reachHz = found.source === 'beside the carriers' ? Infinity : 2 * medianStepHz(axis);
  return (frequencyHz) => {
    const distanceHz = Math.abs((axis[nearestIndex(axis, frequencyHz)] ?? Infinity) - frequencyHz);
    return distanceHz <= reachHz ? floorAt(floor, frequencyHz, marginDb, binsRead) : null;
  };
}

/** C_R − C_E + T_E − T_R, dB: nothing that the analyzer has corrected already, no transmit step that is known for one side only. */
function correctionDb(reference: MeasuredSweep, enclosed: MeasuredSweep): number {
  const lossOf = (one: MeasuredSweep): number => (one.sweep.settings.correctionsApplied === true ? 0 : (one.chainLossDb ?? 0));
  const step = reference.transmitLevelDbm === null || enclosed.transmitLevelDbm === null ? 0 : enclosed.transmitLevelDbm - reference.transmitLevelDbm;
  return lossOf(reference) - lossOf(enclosed) + step;
}

function binsReadAround(enclosed: MeasuredSweep, style: SweepStyle['style']): number {
  if (style === 'continuous') return 1;
  const axis = enclosed.sweep.frequencyHz;
  const middle = axis[axis.length >> 1] ?? NaN;
  const { from, to } = binsAround(axis, middle, carrierToleranceHz(enclosed.sweep));
  return Math.max(1, to - from);
}

const driftWindow = 11;

/** The largest difference of closing and opening reference; along a continuous sweep of running medians, so that noise is no drift. */
function driftOf(differences: readonly number[], style: SweepStyle['style']): number | null {
  const known = differences.filter(Number.isFinite);
  if (known.length === 0) return null;
  const width = style === 'continuous' ? Math.min(driftWindow, known.length) : 1;
  let largest = 0;
  for (let at = 0; at + width <= known.length; at += 1) {
    const middle = known.slice(at, at + width).sort((one, other) => one - other)[width >> 1] ?? 0;
    if (Math.abs(middle) > Math.abs(largest)) largest = middle;
  }
  return largest;
}

/** Frequencies at which the enclosed sweep is read: its own bins, or the carriers of the reference that it covers. */
function frequenciesToRead({ enclosed, style }: PairToRead): readonly number[] {
  if (style.style === 'continuous') return [...enclosed.sweep.frequencyHz];
  const [low, high] = spanOf(enclosed);
  const toleranceHz = carrierToleranceHz(enclosed.sweep);
  return style.carrierHz.filter((frequencyHz) => frequencyHz >= low - toleranceHz && frequencyHz <= high + toleranceHz);
}

/**
 * Reads one enclosed sweep against its reference, frequency by frequency.
 * @param toRead the sweep with its pair, style and floors.
 */
export function readPair(toRead: PairToRead): PairReading {
  const { enclosed, references: { opening, closing }, style, enclosedFloor, referenceFloor, leakage, floorMarginDb } = toRead;
  const read = { opening: levelReader(opening, style.style), closing: closing && levelReader(closing, style.style), enclosed: levelReader(enclosed, style.style), leakage: leakage && levelReader(leakage, style.style) };
  const floorOfEnclosed = floorReader(enclosedFloor, floorMarginDb, binsReadAround(enclosed, style.style));
  const floorOfReference = floorReader(referenceFloor, floorMarginDb, 1);
  const corrected = correctionDb(opening, enclosed);
  const rows: PairRow[] = [];
  const gaps: { frequencyHz: number; reason: GapReason }[] = [];
  const differences: number[] = [];
  let noiseTakenOut = false;
  for (const frequencyHz of frequenciesToRead(toRead)) {
    const openingLevel = read.opening(frequencyHz);
    const closingLevel = read.closing === null ? NaN : read.closing(frequencyHz);
    const enclosedLevel = read.enclosed(frequencyHz);
    const referenceLevel = Number.isFinite(closingLevel) ? (openingLevel + closingLevel) / 2 : openingLevel;
    const reason = gapReason(referenceLevel, enclosedLevel, floorOfReference(frequencyHz));
    if (reason !== null) {
      gaps.push({ frequencyHz, reason });
      continue;
    }
    differences.push(closingLevel - openingLevel);
    const floor = floorOfEnclosed(frequencyHz);
    const leakageLevel = read.leakage === null ? NaN : read.leakage(frequencyHz);
    const result = attenuationOf({ referenceLevel, enclosedLevel, floor, leakageLevel: Number.isFinite(leakageLevel) ? leakageLevel : null, correctionDb: corrected, settings: enclosed.sweep.settings });
    noiseTakenOut ||= result.noiseTakenOut;
    rows.push({ ...result, frequencyHz, referenceLevel, enclosedLevel, floorLevel: floor?.medianLevel ?? NaN });
  }
  return {
    pair: { enclosed: enclosed.traceId, reference: opening.traceId, closing: closing?.traceId ?? null, noise: enclosedFloor.noiseTraceId },
    style: style.style, floorSource: enclosedFloor.source, rows, gaps, stepHz: medianStepHz(enclosed.sweep.frequencyHz),
    driftDb: closing === null ? null : driftOf(differences, style.style),
    doubts: noiseTakenOut ? [{ code: 'noise-taken-out', weight: 'note', message: 'Near the floor the noise power was taken out of power-averaged readings.' }] : [],
  };
}

function gapReason(referenceLevel: number, enclosedLevel: number, floor: FloorLevel | null): GapReason | null {
  if (Number.isNaN(referenceLevel)) return 'reference does not cover';
  if (Number.isNaN(enclosedLevel)) return 'not read';
  return floor !== null && referenceLevel < floor.thresholdLevel + carrierOverThresholdDb ? 'reference too weak' : null;
}
