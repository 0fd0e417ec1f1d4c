import { createHash } from 'node:crypto';
import { readFile, readdir, stat } from 'node:fs/promises';
import { join } from 'node:path';
import { CommandFault } from './exit-code.js';

export interface FolderFile {
  readonly name: string;
  readonly path: string;
  readonly byteCount: number;
  readonly changedAtMs: number;
}

/** What tells one state of a file from another: one that is written anew is another. */
export const markOf = (file: FolderFile): string => `${file.name}\n${file.byteCount}\n${file.changedAtMs}`;

async function describeFile(name: string, path: string): Promise<FolderFile | null> {
  const facts = await stat(path).catch(() => null);
  return facts?.isFile() ? { name, path, byteCount: facts.size, changedAtMs: facts.mtimeMs } : null;
}

/** The plain files of a folder by name; hidden ones and half-written downloads are passed over. */
export async function filesOfFolder(folder: string): Promise<FolderFile[]> {
  const all = await readdir(folder).catch((cause: unknown) => {
    throw new CommandFault(`The folder ${folder} cannot be read: ${cause instanceof Error ? cause.message : 'no reason given'}`);
  });
  const names = all.filter((name) => !name.startsWith('.') && !/\.(part|tmp|crdownload)$/i.test(name)).sort();
  const files = await Promise.all(names.map((name) => describeFile(name, join(folder, name))));
  return files.filter((file) => file !== null);
}

export interface FileBytes {
  readonly bytes: Uint8Array<ArrayBuffer>;
  readonly sha256: string;
}

/** The bytes of a file with their SHA-256, or the words for why there are none. A file that changes meanwhile is not whole. */
export async function bytesOf(file: FolderFile): Promise<FileBytes | string> {
  try {
    const bytes = new Uint8Array(await readFile(file.path));
    const now = await describeFile(file.name, file.path);
    if (now === null || markOf(now) !== markOf(file) || bytes.length !== file.byteCount) return 'It is being written or moved.';
    return { bytes, sha256: createHash('sha256').update(bytes).digest('hex') };
  } catch (cause) {
    return `It cannot be opened: ${cause instanceof Error ? cause.message : 'no reason given'}`;
  }
}
