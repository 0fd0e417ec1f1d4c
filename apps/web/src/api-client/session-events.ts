import { sessionEventSchema, type SessionEvent } from '@leeside/contracts/session-events';
import { streamSessionEvents } from '@leeside/contracts/sessions';
import { endpointUrl } from './endpoint-url';

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

/** Listens to a session until the returned function is called; the browser reconnects by itself. */
export function listenToSession(sessionId: string, onEvent: (event: SessionEvent) => void, onReconnect: () => void): () => void {
  const source = new EventSource(endpointUrl(streamSessionEvents, { params: { id: sessionId } }));
  let opened = false;
  source.addEventListener('open', () => {
    if (opened) onReconnect();
    opened = true;
  });
  for (const kind of eventKinds) {
    source.addEventListener(kind, (message: MessageEvent<string>) => {
      const event = readSessionEvent(kind, message.data);
      if (event) onEvent(event);
    });
  }
  return () => source.close();
}
