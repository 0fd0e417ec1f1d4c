import type { Doubt } from '@leeside/trace-reading/transcription';
import type { Requirement } from './curve-input.js';
import type { Outcome } from './curve-result.js';
import type { CurveRow } from './fold-repeats.js';
import { requiredAt } from './required-attenuation.js';

export interface Judgement {
  readonly outcome: Outcome | null;
  readonly decidedAtHz: number | null;
  readonly notMeasured: readonly { fromHz: number; toHz: number }[];
  readonly doubts: readonly Doubt[];
}

const worstFirst: readonly Outcome[] = ['falls short', 'beyond reach', 'too close to call', 'not all measured', 'meets'];

/**
 * Outcome at one frequency by the decision rule.
 * @param row the curve there.
 * @param requiredDb what is asked, dB.
 * @param guardDb w: 0 for the simple rule.
 */
export function outcomeAt(row: CurveRow, requiredDb: number, guardDb: number): Outcome {
  const marginDb = row.attenuationDb - requiredDb;
  if (marginDb >= guardDb) return 'meets';
  if (row.atLeast) {
    if (Number.isNaN(row.atMostDb)) return 'beyond reach';
    const isShort = guardDb === 0 ? row.atMostDb < requiredDb : row.atMostDb <= requiredDb - guardDb;
    return isShort ? 'falls short' : 'beyond reach';
  }
  const highest = marginDb + row.excessDb;
  return (guardDb === 0 ? highest < 0 : highest <= -guardDb) ? 'falls short' : 'too close to call';
}

/** What the requirement covers and no reading stands for: one reading stands for f/q to f·q. */
export function findNotMeasured(rows: readonly CurveRow[], requirement: Requirement): { fromHz: number; toHz: number }[] {
  const ratio = requirement.standsForRatio * (1 + 1e-12);
  const missing: { fromHz: number; toHz: number }[] = [];
  for (const segment of requirement.segments) {
    let coveredHz = segment.fromHz;
    for (const row of rows) {
      if (row.frequencyHz * ratio < coveredHz) continue;
      if (row.frequencyHz / ratio > segment.toHz) break;
      if (row.frequencyHz / ratio > coveredHz) missing.push({ fromHz: coveredHz, toHz: row.frequencyHz / requirement.standsForRatio });
      coveredHz = row.frequencyHz * requirement.standsForRatio;
    }
    if (coveredHz * (1 + 1e-12) < segment.toHz) missing.push({ fromHz: coveredHz, toHz: segment.toHz });
  }
  return missing;
}

/**
 * Judges a curve: its outcome is the worst of all frequencies, in the order falls short, beyond reach, too close to call, not all
 * measured, meets. A guarded rule without uncertainty gives no outcome: w is never 0 in silence.
 * @param rows the curve.
 * @param requirement null gives no outcome.
 */
export function judge(rows: readonly CurveRow[], requirement: Requirement | null): Judgement {
  if (requirement === null) return { outcome: null, decidedAtHz: null, notMeasured: [], doubts: [] };
  const notMeasured = findNotMeasured(rows, requirement);
  if (requirement.rule === 'guarded') {
    const message = 'The requirement asks for a guard band, and this curve has no uncertainty: no outcome is given.';
    return { outcome: null, decidedAtHz: null, notMeasured, doubts: [{ code: 'no-uncertainty', weight: 'stops signing', message }] };
  }
  let worst: Outcome = notMeasured.length > 0 ? 'not all measured' : 'meets';
  let decidedAtHz: number | null = null;
  let smallestMarginDb = Infinity;
  for (const row of rows) {
    const requiredDb = requiredAt(requirement, row.frequencyHz);
    if (Number.isNaN(requiredDb)) continue;
    const here = outcomeAt(row, requiredDb, 0);
    const rank = worstFirst.indexOf(here) - worstFirst.indexOf(worst);
    const marginDb = row.attenuationDb - requiredDb;
    if (rank < 0 || (here === worst && marginDb < smallestMarginDb)) {
      worst = here;
      decidedAtHz = row.frequencyHz;
      smallestMarginDb = marginDb;
    }
  }
  return { outcome: worst, decidedAtHz, notMeasured, doubts: [] };
}
