import { valueAt } from '@leeside/units/value-at';
import type { Doubt } from '@leeside/trace-reading/transcription';
import { medianStepHz, nearestIndex } from './axis-search.js';
import { binsAround, carrierToleranceHz, highestBin, carrierOverThresholdDb } from './carriers.js';
import type { MeasuredSweep } from './curve-input.js';
import type { FloorSource, GapReason, Pair } from './curve-result.js';
import type { FoundFloor } from './floor-source.js';
import { interpolateLevel } from './interpolate-level.js';
import { floorAt, type FloorLevel } from './noise-floor.js';
import { attenuationOf, type Reading } from './reading-points.js';
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
    return bin < 0 ? NaN : valueAt(sweep.level, bin);
  };
}

function floorReader(found: FoundFloor, marginDb: number, binsRead: number): (frequencyHz: number) => FloorLevel | null {
  const { floor } = found;
  if (floor === null) return () => null;
  const axis = floor.frequencyHz;
  const reachHz = found.source === 'beside the carriers' ? Infinity : 2 * medianStepHz(axis);
  return (frequencyHz) => {
    const distanceHz = Math.abs(valueAt(axis, nearestIndex(axis, frequencyHz)) - frequencyHz);
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
  const middle = valueAt(axis, axis.length >> 1);
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

/** Reads everything that is known at one frequency. */
function frequencyReader(toRead: PairToRead): (frequencyHz: number) => { readonly reading: Reading; readonly movedDb: number; readonly gap: GapReason | null } {
  const { enclosed, references: { opening, closing }, style: { style }, leakage, floorMarginDb } = toRead;
  const nothing: LevelAt = () => NaN;
  const read = {
    opening: levelReader(opening, style), closing: closing === null ? nothing : levelReader(closing, style), enclosed: levelReader(enclosed, style), leakage: leakage === null ? nothing : levelReader(leakage, style),
    floor: floorReader(toRead.enclosedFloor, floorMarginDb, binsReadAround(enclosed, style)), referenceFloor: floorReader(toRead.referenceFloor, floorMarginDb, 1),
  };
  const corrected = correctionDb(opening, enclosed);
  return (frequencyHz) => {
    const [openingLevel, closingLevel, leakageLevel] = [read.opening(frequencyHz), read.closing(frequencyHz), read.leakage(frequencyHz)];
    const referenceLevel = Number.isFinite(closingLevel) ? (openingLevel + closingLevel) / 2 : openingLevel;
    const enclosedLevel = read.enclosed(frequencyHz);
    const reading = { referenceLevel, enclosedLevel, floor: read.floor(frequencyHz), leakageLevel: Number.isFinite(leakageLevel) ? leakageLevel : null, correctionDb: corrected, settings: enclosed.sweep.settings };
    return { reading, movedDb: closingLevel - openingLevel, gap: gapReason(referenceLevel, enclosedLevel, read.referenceFloor(frequencyHz)) };
  };
}

/**
 * Reads one enclosed sweep against its reference, frequency by frequency.
 * @param toRead the sweep with its pair, style and floors.
 */
export function readPair(toRead: PairToRead): PairReading {
  const { enclosed, references: { opening, closing }, style: { style }, enclosedFloor } = toRead;
  const readAt = frequencyReader(toRead);
  const rows: PairRow[] = [];
  const gaps: { frequencyHz: number; reason: GapReason }[] = [];
  const movedDb: number[] = [];
  let noiseTakenOut = false;
  for (const frequencyHz of frequenciesToRead(toRead)) {
    const { reading, movedDb: moved, gap } = readAt(frequencyHz);
    if (gap !== null) {
      gaps.push({ frequencyHz, reason: gap });
      continue;
    }
    const result = attenuationOf(reading);
    movedDb.push(moved);
    noiseTakenOut ||= result.noiseTakenOut;
    rows.push({ ...result, frequencyHz, referenceLevel: reading.referenceLevel, enclosedLevel: reading.enclosedLevel, floorLevel: reading.floor === null ? NaN : reading.floor.medianLevel });
  }
  return {
    pair: { enclosed: enclosed.traceId, reference: opening.traceId, closing: closing === null ? null : closing.traceId, noise: enclosedFloor.noiseTraceId },
    style, floorSource: enclosedFloor.source, rows, gaps, stepHz: medianStepHz(enclosed.sweep.frequencyHz), driftDb: closing === null ? null : driftOf(movedDb, style),
    doubts: noiseTakenOut ? [{ code: 'noise-taken-out', weight: 'note', message: 'Near the floor the noise power was taken out of power-averaged readings.' }] : [],
  };
}

function gapReason(referenceLevel: number, enclosedLevel: number, floor: FloorLevel | null): GapReason | null {
  if (Number.isNaN(referenceLevel)) return 'reference does not cover';
  if (Number.isNaN(enclosedLevel)) return 'not read';
  return floor !== null && referenceLevel < floor.thresholdLevel + carrierOverThresholdDb ? 'reference too weak' : null;
}
