import { getCurvePoints, type CurvePointsBody } from '@leeside/contracts/curves';
import { keepPreviousData, type UseQueryResult } from '@tanstack/react-query';
import { useApiQuery } from '../../api-client/use-api-query';
import type { FrequencyWindow } from '../plot/frequency-ticks';
import { widened } from '../plot/frequency-window';

const columnStep = 200;

/** Two points a pixel column, in steps, so that a window dragged wider does not ask for every width between. */
export const pointsForWidth = (widthPx: number): number => 2 * Math.max(columnStep, Math.ceil(widthPx / columnStep) * columnStep);

/** The points of a curve in a window (all without one), as many as the pixels need. What was there stays until the new ones come. */
export function useCurvePoints(curveId: string, window: FrequencyWindow | null, widthPx: number, revision: number): UseQueryResult<CurvePointsBody> {
  const query = { maxPoints: pointsForWidth(widthPx), ...(window ? widened(window) : {}) };
  return useApiQuery(getCurvePoints, { params: { id: curveId }, query }, {
    enabled: widthPx > 0, placeholderData: keepPreviousData, staleTime: 60_000, meta: { revision },
  });
}
