import { getCurveLevels, type CurveLevelsBody } from '@leeside/contracts/curves';
import { keepPreviousData, type UseQueryResult } from '@tanstack/react-query';
import { useApiQuery } from '../../api-client/use-api-query';
import type { FrequencyWindow } from '../plot/frequency-ticks';
import { widened } from '../plot/frequency-window';

/** The levels beneath a curve in a window, on the same axis and in the same fineness as its points. */
export function useCurveLevels(curveId: string, window: FrequencyWindow | null, maxPoints: number): UseQueryResult<CurveLevelsBody> {
  return useApiQuery(getCurveLevels, { params: { id: curveId }, query: { maxPoints, ...(window ? widened(window) : {}) } }, {
    enabled: maxPoints > 0, placeholderData: keepPreviousData, staleTime: 60_000,
  });
}
