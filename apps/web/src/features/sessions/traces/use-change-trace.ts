import { listCurves } from '@leeside/contracts/curves';
import { getSession } from '@leeside/contracts/sessions';
import { getToday } from '@leeside/contracts/today';
import { changeTrace, listTraces } from '@leeside/contracts/traces';
import type { EndpointInput } from '../../../api-client/endpoint-input';
import { useApiChange } from '../../../api-client/use-api-change';

export type TraceChange = EndpointInput<typeof changeTrace>['body'];

/** Changes what a trace is; the curves that depend on it are asked for again. */
export function useChangeTrace() {
  return useApiChange(changeTrace, [listTraces, listCurves, getSession, getToday]);
}
