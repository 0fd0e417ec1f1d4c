import type { Doubt } from '@leeside/trace-reading/transcription';
import { bandsOf, lowestOf } from './bands.js';
import { carrierToleranceHz, floorBesideCarriers, highestBin } from './carriers.js';
import type { CurveInput, MeasuredSweep } from './curve-input.js';
import type { CurveOutcome, FloorSource, GapReason } from './curve-result.js';
import { pointsOf } from './curve-points.js';
import { findFloor } from './floor-source.js';
import { foldRepeats } from './fold-repeats.js';
import { gapsOf } from './gaps.js';
import { judge } from './outcome.js';
import { harmonicDoubts, holdDoubts, overloadDoubts, settingDoubts } from './pair-doubts.js';
import { candidateReferences, compareInTime, pairNoise, pairReference, type ReferencePair } from './pair-sweeps.js';
import { readPair, type PairReading } from './read-pair.js';
import { sweepStyle, type SweepStyle } from './sweep-style.js';
import { readTypedLevels } from './typed-levels.js';

/** Written with every curve: a change of what is computed changes it. */
export const analysisVersion = '1';

/**
 * Computes the curve of one sample in one condition from everything that a session measured.
 * @param input enclosed sweeps of this curve, the session's references, noise, leakage and ambient sweeps, typed levels, what the lab
 * set, and the requirement.
 * @returns the curve, or why there is none. The same input gives the same bytes.
 */
export function curveFromSweeps(input: CurveInput): CurveOutcome {
  const readings = readEverything(input);
  const { rows, doubts: seamDoubts } = foldRepeats(readings);
  if (rows.length === 0) return { kind: 'no curve', reason: whyNothing(input, readings), doubts: doubtsOf(readings) };
  const judgement = judge(rows, input.requirement);
  const drift = driftOf(readings);
  return {
    kind: 'curve', style: styleOf(readings, rows.length), points: pointsOf(rows, input.requirement), gaps: gapsOf(readings, rows),
    bands: bandsOf(rows, input.requirement), lowest: lowestOf(rows), outcome: judgement.outcome, decidedAtHz: judgement.decidedAtHz,
    notMeasured: judgement.notMeasured,
    doubts: unique([...doubtsOf(readings), ...seamDoubts, ...driftDoubts(drift, readings, input), ...floorDoubts(readings), ...judgement.doubts]),
    floorSource: floorSourceOf(readings), driftDb: drift, inputs: inputsOf(readings), pairs: readings.map((reading) => reading.pair),
  };
}

function readEverything(input: CurveInput): PairReading[] {
  const enclosed = [...input.enclosed].sort(compareInTime);
  const readings = enclosed.flatMap((one) => readEnclosed(one, input));
  const typed = readTypedLevels(input.levels, input.parameters);
  return typed === null ? readings : [...readings, typed];
}

/** One enclosed sweep; a spot sweep may hold several spots, each with a reference of its own. */
function readEnclosed(enclosed: MeasuredSweep, input: CurveInput): PairReading[] {
  const styled = candidateReferences(enclosed, input.references).map((reference) => ({ reference, style: styleOfReference(reference, input) }));
  const spots = styled.filter(({ style }) => style.style === 'spot');
  if (styled.length > 0 && spots.length === styled.length) {
    return spotFrequencies(spots).flatMap(({ references, style }) => readAgainst(enclosed, pairReference(enclosed, references), style, input));
  }
  const pair = pairReference(enclosed, styled.map(({ reference }) => reference));
  const style = styled.find(({ reference }) => reference === pair?.opening)?.style;
  return style === undefined ? [] : readAgainst(enclosed, pair, style, input);
}

function styleOfReference(reference: MeasuredSweep, input: CurveInput): SweepStyle {
  const noise = pairNoise(reference, input.noises);
  const floor = noise === null ? null : findFloor(reference, [noise], null).floor;
  return sweepStyle(reference.sweep, floor, input.parameters.floorMarginDb);
}

/** Spot references grouped by the carrier that they hold. */
function spotFrequencies(spots: readonly { reference: MeasuredSweep; style: SweepStyle }[]): { references: MeasuredSweep[]; style: SweepStyle }[] {
  const groups: { references: MeasuredSweep[]; style: SweepStyle }[] = [];
  for (const { reference, style } of spots) {
    const [frequencyHz] = style.carrierHz;
    const toleranceHz = carrierToleranceHz(reference.sweep);
    const group = groups.find((one) => Math.abs((one.style.carrierHz[0] ?? NaN) - (frequencyHz ?? NaN)) <= toleranceHz);
    if (group) group.references.push(reference);
    else groups.push({ references: [reference], style });
  }
  return groups;
}

function readAgainst(enclosed: MeasuredSweep, references: ReferencePair | null, style: SweepStyle, input: CurveInput): PairReading[] {
  if (references === null) return [];
  const { opening } = references;
  const besideCarriers = style.style === 'continuous' ? null : floorBesideCarriers(enclosed.sweep, style.carrierHz);
  const enclosedFloor = findFloor(enclosed, input.noises, besideCarriers);
  const referenceFloor = style.ownFloor === null ? findFloor(opening, input.noises, null) : { source: 'beside the carriers' as const, floor: style.ownFloor, noiseTraceId: null, doubts: [] };
  const leakage = candidateReferences(enclosed, input.leakages)[0] ?? null;
  const reading = readPair({ enclosed, references, style, enclosedFloor, referenceFloor, leakage, floorMarginDb: input.parameters.floorMarginDb });
  const levelAt = (frequencyHz: number): number => opening.sweep.level[highestBin(opening.sweep, frequencyHz, carrierToleranceHz(opening.sweep))] ?? NaN;
  return [{
    ...reading,
    doubts: [...reading.doubts, ...enclosedFloor.doubts, ...settingDoubts(opening, enclosed), ...overloadDoubts(opening), ...overloadDoubts(enclosed),
      ...holdDoubts(opening, enclosed, style.style), ...harmonicDoubts(style.carrierHz, levelAt, carrierToleranceHz(opening.sweep)), ...ambientDoubts(reading, input)],
  }];
}

const ambientWithinDb = 10;

function ambientDoubts(reading: PairReading, input: CurveInput): Doubt[] {
  const loud = input.ambients.some(({ sweep }) => reading.rows.some((row) => {
    const bin = highestBin(sweep, row.frequencyHz, carrierToleranceHz(sweep));
    return !row.atLeast && bin >= 0 && (sweep.level[bin] ?? -Infinity) > row.enclosedLevel - ambientWithinDb && (sweep.level[bin] ?? -Infinity) > row.floorLevel + ambientWithinDb;
  }));
  return loud ? [{ code: 'ambient-near', weight: 'doubt', message: 'A signal of somebody else stands within 10 dB of a reading.' }] : [];
}

function whyNothing(input: CurveInput, readings: readonly PairReading[]): string {
  if (input.enclosed.length === 0 && !input.levels.some((level) => level.role === 'enclosed')) return 'There is no enclosed sweep.';
  if (input.references.length === 0 && !input.levels.some((level) => level.role === 'reference')) return 'There is no reference sweep in this session yet.';
  const reasons = new Set<GapReason>(readings.flatMap((reading) => reading.gaps.map((gap) => gap.reason)));
  return reasons.size > 0 ? `Nothing could be read: ${[...reasons].join(', ')}.` : 'No reference has the unit, polarisation, position and frequencies of the enclosed sweep.';
}

const doubtsOf = (readings: readonly PairReading[]): Doubt[] => readings.flatMap((reading) => reading.doubts);

function unique(doubts: readonly Doubt[]): Doubt[] {
  const seen = new Set<string>();
  return doubts.filter(({ code, message }) => !seen.has(`${code}\n${message}`) && seen.add(`${code}\n${message}`) !== undefined);
}

function driftOf(readings: readonly PairReading[]): number | null {
  return readings.map((reading) => reading.driftDb).filter((drift) => drift !== null).reduce<number | null>((worst, drift) => (worst === null || Math.abs(drift) > Math.abs(worst) ? drift : worst), null);
}

function driftDoubts(driftDb: number | null, readings: readonly PairReading[], { parameters: { driftLimitDb } }: CurveInput): Doubt[] {
  if (driftDb !== null && Math.abs(driftDb) > driftLimitDb) {
    return [{ code: 'reference-moved', weight: 'stops signing', message: `The reference moved by ${driftDb.toFixed(1)} dB between opening and closing; the limit is ${driftLimitDb} dB (IEEE Std 299-2006, 4.4).` }];
  }
  if (readings.some((reading) => reading.pair.closing === null)) return [{ code: 'no-closing-reference', weight: 'note', message: 'No reference was taken after the enclosed sweep: drift is not known.' }];
  return [];
}

function floorDoubts(readings: readonly PairReading[]): Doubt[] {
  if (!readings.some((reading) => reading.floorSource === 'none')) return [];
  return [{ code: 'no-floor', weight: 'doubt', message: 'There is no noise sweep with these settings and no floor beside carriers: nothing was called "in the noise", and there is no ceiling.' }];
}

function floorSourceOf(readings: readonly PairReading[]): FloorSource {
  const order: readonly FloorSource[] = ['noise sweep', 'beside the carriers', 'typed', 'none'];
  return order.find((source) => readings.some((reading) => reading.floorSource === source)) ?? 'none';
}

function styleOf(readings: readonly PairReading[], rowCount: number): SweepStyle['style'] {
  if (readings.some((reading) => reading.style === 'continuous')) return 'continuous';
  return rowCount === 1 || readings.every((reading) => reading.style === 'spot') ? 'spot' : 'comb';
}

function inputsOf(readings: readonly PairReading[]): string[] {
  const ids = readings.flatMap(({ pair }) => [pair.enclosed, pair.reference, pair.closing, pair.noise]).filter((id): id is string => id !== null && id !== 'typed');
  return [...new Set(ids)].sort();
}

