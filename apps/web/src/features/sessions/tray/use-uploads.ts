import { useEffect, useSyncExternalStore } from 'react';
import { uploadStore, type LocalUpload } from './upload-store';

const isUnderWay = (upload: LocalUpload): boolean => upload.phase === 'queued' || upload.phase === 'sending';

/** What this tab is sending into a session and the server does not list yet. */
export function useUploads(sessionId: string, listedIds: readonly string[]): LocalUpload[] {
  const all = useSyncExternalStore(uploadStore.subscribe, uploadStore.get);
  const own = all.filter((upload) => upload.sessionId === sessionId);
  const listed = own.filter((upload) => upload.fileId !== null && !upload.duplicate && listedIds.includes(upload.fileId)).map(({ key }) => key).join(' ');
  useEffect(() => {
    if (listed) uploadStore.drop(listed.split(' '));
  }, [listed]);
  const sending = all.some(isUnderWay);
  useEffect(() => {
    if (!sending) return undefined;
    const warn = (event: BeforeUnloadEvent): void => event.preventDefault();
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, [sending]);
  return own.filter(({ key }) => !listed.split(' ').includes(key));
}
