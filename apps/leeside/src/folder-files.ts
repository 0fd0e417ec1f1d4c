import { createHash } from 'node:crypto';
import { readFile, readdir, stat } from 'node:fs/promises';
import { join } from 'node:path';

export interface FolderFile {
  readonly name: string;
  readonly path: string;
  readonly byteCount: number;
  readonly changedAtMs: number;
}

/** The plain files of a folder by name; hidden ones and half-written downloads are passed over. */
export async function filesOfFolder(folder: string): Promise<FolderFile[]> {
  const names = (await readdir(folder)).filter((name) => !name.startsWith('.') && !/\.(part|tmp|crdownload)$/i.test(name)).sort();
  const files = await Promise.all(names.map(async (name) => {
    const path = join(folder, name);
    const facts = await stat(path).catch(() => null);
    return facts?.isFile() ? { name, path, byteCount: facts.size, changedAtMs: facts.mtimeMs } : null;
  }));
  return files.filter((file) => file !== null);
}

/** Whether a file has been left alone long enough to be whole. */
export function isSettled(file: FolderFile, nowMs: number, quietMs = 1000): boolean {
  return file.byteCount > 0 && nowMs - file.changedAtMs >= quietMs;
}

/** The bytes of a file with their SHA-256. */
export async function bytesOf(file: FolderFile): Promise<{ bytes: Uint8Array<ArrayBuffer>; sha256: string }> {
  const bytes = new Uint8Array(await readFile(file.path));
  return { bytes, sha256: createHash('sha256').update(bytes).digest('hex') };
}
