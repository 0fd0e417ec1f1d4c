import type { Gap } from './curve-result.js';
import type { CurveRow } from './fold-repeats.js';
import type { PairReading } from './read-pair.js';

/**
 * Stretches without a number: neighbouring frequencies with the same reason become one gap; what any repeat could read is none.
 * @param readings all pairs.
 * @param rows the folded curve.
 */
export function gapsOf(readings: readonly PairReading[], rows: readonly CurveRow[]): Gap[] {
  const read = new Set(rows.map((row) => row.frequencyHz));
  const missing = readings.flatMap((reading) => reading.gaps.map((gap) => ({ ...gap, stepHz: reading.stepHz }))).filter((gap) => !read.has(gap.frequencyHz));
  missing.sort((one, other) => one.frequencyHz - other.frequencyHz);
  const gaps: { fromHz: number; toHz: number; reason: Gap['reason'] }[] = [];
  for (const { frequencyHz, reason, stepHz } of missing) {
    const last = gaps.at(-1);
    if (last && last.reason === reason && frequencyHz - last.toHz <= 1.5 * stepHz) last.toHz = frequencyHz;
    else if (!last || last.toHz !== frequencyHz || last.reason !== reason) gaps.push({ fromHz: frequencyHz, toHz: frequencyHz, reason });
  }
  return gaps;
}
