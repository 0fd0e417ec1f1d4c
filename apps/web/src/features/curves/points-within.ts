import type { CurvePointsBody } from '@leeside/contracts/curves';
import type { FrequencyWindow } from '../../components/plot/frequency-ticks';

/** The points that lie in a window, for the cursor and the table; the plot draws on to its edges. All of them without one. */
export function pointsWithin(points: CurvePointsBody, window: FrequencyWindow | null): CurvePointsBody {
  if (!window) return points;
  const first = points.frequencyHz.findIndex((hz) => hz >= window.fromHz);
  const last = points.frequencyHz.findLastIndex((hz) => hz <= window.toHz);
  const cut = <Value>(column: readonly Value[]): Value[] => (first < 0 ? [] : column.slice(first, last + 1));
  return {
    frequencyHz: cut(points.frequencyHz), attenuationDb: cut(points.attenuationDb), atLeast: cut(points.atLeast), atMostDb: cut(points.atMostDb),
    ceilingDb: cut(points.ceilingDb), expandedUncertaintyDb: cut(points.expandedUncertaintyDb), requiredDb: cut(points.requiredDb),
  };
}
