import { sessionEventSchema, type SessionEvent } from '@leeside/contracts/session-events';
import { streamSessionEvents } from '@leeside/contracts/sessions';
import { endpointUrl } from './endpoint-url';
import { renewSession } from './renew-session';

export const eventKinds = ['file', 'curve', 'progress'] as const;

/** Reads one event; null where it is not understood (a newer server), which is harmless. */
export function readSessionEvent(kind: string, data: string): SessionEvent | null {
  try {
    const body: unknown = JSON.parse(data);
    const parsed = sessionEventSchema.safeParse(typeof body === 'object' && body !== null ? { kind, ...body } : body);
    return parsed.success ? parsed.data : null;
  } catch {
    return null;
  }
}

const reopenAfterMs = 5_000;

/** Listens to a session until the returned function is called. The browser reconnects by itself; where it was refused, the session is renewed first. */
export function listenToSession(sessionId: string, onEvent: (event: SessionEvent) => void, onReconnect: () => void): () => void {
  let source: EventSource | null = null;
  let again: ReturnType<typeof setTimeout> | undefined;
  let opened = false;
  const open = (): void => {
    source = new EventSource(endpointUrl(streamSessionEvents, { params: { id: sessionId } }));
    source.addEventListener('open', () => {
      if (opened) onReconnect();
      opened = true;
    });
    source.addEventListener('error', () => {
      if (source?.readyState === EventSource.CLOSED) again = setTimeout(() => void renewSession().then((renewed) => renewed && open()), reopenAfterMs);
    });
    for (const kind of eventKinds) {
      source.addEventListener(kind, (message: MessageEvent<string>) => {
        const event = readSessionEvent(kind, message.data);
        if (event) onEvent(event);
      });
    }
  };
  open();
  return () => {
    clearTimeout(again);
    source?.close();
  };
}
