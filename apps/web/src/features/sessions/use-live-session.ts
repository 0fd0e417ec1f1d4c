import { getCurve, listCurves } from '@leeside/contracts/curves';
import { getFile } from '@leeside/contracts/files';
import type { SessionEvent } from '@leeside/contracts/session-events';
import { getSession, type Session } from '@leeside/contracts/sessions';
import { listTraces } from '@leeside/contracts/traces';
import { useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { listenToSession } from '../../api-client/session-events';
import { queryKeyOf } from '../../api-client/use-api-query';
import { afterEvent } from './after-event';

const gatherMs = 250;

const staleAfter: Record<SessionEvent['kind'], readonly string[]> = {
  file: [getFile.name, listTraces.name, getSession.name],
  curve: [listCurves.name, getCurve.name, getSession.name],
  progress: [listCurves.name],
};

/** Follows a session while it is on show: what events say is shown at once, and what they imply is asked for shortly after. */
export function useLiveSession(sessionId: string): void {
  const client = useQueryClient();
  useEffect(() => {
    const stale = new Set<string>();
    let timer: ReturnType<typeof setTimeout> | null = null;
    const ask = (names: readonly string[]): void => {
      names.forEach((name) => stale.add(name));
      timer ??= setTimeout(() => {
        timer = null;
        const now = [...stale];
        stale.clear();
        void Promise.all(now.map((name) => client.invalidateQueries({ queryKey: [name] })));
      }, gatherMs);
    };
    const stop = listenToSession(
      sessionId,
      (event) => {
        client.setQueryData<Session>(queryKeyOf(getSession, { params: { id: sessionId } }), (session) => session && afterEvent(session, event));
        ask(staleAfter[event.kind]);
      },
      () => ask([getSession.name, getFile.name, listTraces.name, listCurves.name]),
    );
    return () => {
      stop();
      if (timer) clearTimeout(timer);
    };
  }, [client, sessionId]);
}
