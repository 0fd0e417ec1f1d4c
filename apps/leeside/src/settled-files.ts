import { markOf, type FolderFile } from './folder-files.js';

/**
 * Picks the files that stayed as they are for a while, by our own clock: the time on a file may be that of an
 * instrument or a share whose clock is wrong, or of the original that is still being copied. Empty ones are not begun yet.
 */
export function makeSettledFiles(quietMs: number, nowMs: () => number = () => performance.now()): (files: readonly FolderFile[]) => FolderFile[] {
  let seenSinceMs = new Map<string, number>();
  return (files) => {
    const now = nowMs();
    seenSinceMs = new Map(files.map((file) => [markOf(file), seenSinceMs.get(markOf(file)) ?? now]));
    return files.filter((file) => file.byteCount > 0 && now - (seenSinceMs.get(markOf(file)) ?? now) >= quietMs);
  };
}
