import type { SessionEvent } from '@leeside/contracts/session-events';
import type { Session } from '@leeside/contracts/sessions';

/** A session as one of its events leaves it. */
export function afterEvent(session: Session, event: SessionEvent): Session {
  if (event.kind === 'progress') return { ...session, progress: event.progress };
  if (event.kind === 'curve') return session;
  const known = session.files.some(({ id }) => id === event.id);
  const files = known
    ? session.files.map((file) => (file.id === event.id ? { ...file, state: event.state } : file))
    : [...session.files, { id: event.id, name: event.name, state: event.state, setAsideAt: null }];
  return { ...session, files };
}
