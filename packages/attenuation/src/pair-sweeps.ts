import type { MeasuredSweep } from './curve-input.js';

/** The reference before, the one that closes, and what was doubted about the choice. */
export interface ReferencePair {
  readonly opening: MeasuredSweep;
  readonly closing: MeasuredSweep | null;
}

/** Negative where `one` came before `other`: by time where both have one, else by upload order. */
export function compareInTime(one: MeasuredSweep, other: MeasuredSweep): number {
  if (one.measuredAtMs !== null && other.measuredAtMs !== null && one.measuredAtMs !== other.measuredAtMs) return one.measuredAtMs - other.measuredAtMs;
  return one.uploadOrder - other.uploadOrder;
}

/** Share of a sweep's span that another covers, 0 to 1. */
export function coverageOf(sweep: MeasuredSweep, by: MeasuredSweep): number {
  const [low, high] = spanOf(sweep);
  const [byLow, byHigh] = spanOf(by);
  if (high === low) return byLow <= low && low <= byHigh ? 1 : 0;
  return Math.max(0, Math.min(high, byHigh) - Math.max(low, byLow)) / (high - low);
}

/** First and last frequency of a sweep, Hz. */
export function spanOf({ sweep }: MeasuredSweep): readonly [number, number] {
  return [sweep.frequencyHz[0] ?? NaN, sweep.frequencyHz.at(-1) ?? NaN];
}

/** An unstated polarisation or position of the reference stands for any. */
function fits(stated: string, wanted: string): boolean {
  return stated === wanted || stated === '';
}

function exactness(reference: MeasuredSweep, enclosed: MeasuredSweep): number {
  return Number(reference.polarisation === enclosed.polarisation) + Number(reference.position === enclosed.position);
}

/**
 * References that may stand for an enclosed sweep: equal unit, polarisation and position, covering most of what any of them covers.
 * @param enclosed the sweep inside the sample.
 * @param references all references of the session.
 */
export function candidateReferences(enclosed: MeasuredSweep, references: readonly MeasuredSweep[]): MeasuredSweep[] {
  const fitting = references.filter((one) => one.sweep.levelUnit === enclosed.sweep.levelUnit &&
    fits(one.polarisation, enclosed.polarisation) && fits(one.position, enclosed.position) && coverageOf(enclosed, one) > 0);
  const most = Math.max(...fitting.map((one) => coverageOf(enclosed, one)));
  const covering = fitting.filter((one) => coverageOf(enclosed, one) >= most - 0.01);
  const closest = Math.max(...covering.map((one) => exactness(one, enclosed)));
  return covering.filter((one) => exactness(one, enclosed) === closest).sort(compareInTime);
}

/**
 * The reference nearest in time before the enclosed sweep, closed by the nearest after it; where there is none before, the nearest after
 * it stands alone. A person's choice goes before all.
 * @param enclosed the sweep inside the sample.
 * @param candidates references that may stand for it, in time.
 * @returns null where there is none.
 */
export function pairReference(enclosed: MeasuredSweep, candidates: readonly MeasuredSweep[]): ReferencePair | null {
  const chosen = candidates.find((one) => one.traceId === enclosed.pairedWith);
  const after = candidates.find((one) => compareInTime(one, enclosed) > 0 && one !== chosen) ?? null;
  const before = chosen ?? candidates.findLast((one) => compareInTime(one, enclosed) < 0) ?? null;
  if (before !== null) return { opening: before, closing: after };
  return after === null ? null : { opening: after, closing: null };
}

const knownAndDifferent = (one: unknown, other: unknown): boolean => one !== undefined && other !== undefined && one !== other;

/**
 * The noise sweep for a sweep: equal unit; no detector, trace mode or averaging known to differ; covering most; nearest in time.
 * @param measured the sweep whose floor is sought.
 * @param noises all noise sweeps of the session.
 */
export function pairNoise(measured: MeasuredSweep, noises: readonly MeasuredSweep[]): MeasuredSweep | null {
  const usable = noises.filter(({ sweep }) => sweep.levelUnit === measured.sweep.levelUnit &&
    !knownAndDifferent(sweep.settings.detector, measured.sweep.settings.detector) &&
    !knownAndDifferent(sweep.settings.traceMode, measured.sweep.settings.traceMode) &&
    !knownAndDifferent(sweep.settings.averaging, measured.sweep.settings.averaging));
  const covering = usable.filter((one) => coverageOf(measured, one) > 0);
  const most = Math.max(...covering.map((one) => coverageOf(measured, one)));
  const distance = (one: MeasuredSweep): number => Math.abs(compareInTime(one, measured));
  return covering.filter((one) => coverageOf(measured, one) >= most - 0.01).sort((one, other) => distance(one) - distance(other))[0] ?? null;
}
