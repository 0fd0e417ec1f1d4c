import { createHash, randomUUID } from 'node:crypto';
import { constants, createReadStream, createWriteStream } from 'node:fs';
import { access, mkdir, open, readFile, readdir, rename, rm, stat } from 'node:fs/promises';
import { dirname, join, relative, sep } from 'node:path';
import type { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import type { ObjectStore, TemporaryObject } from './object-store.js';

const isMissing = (fault: unknown): boolean => fault instanceof Error && 'code' in fault && fault.code === 'ENOENT';
const wellFormedKey = /^[a-z]+(\/[0-9a-f-]+)+$/;

async function syncFolder(folder: string): Promise<void> {
  const handle = await open(folder, 'r');
  await handle.sync().finally(() => handle.close());
}

async function* filesBelow(folder: string): AsyncIterable<string> {
  for (const entry of await readdir(folder, { withFileTypes: true })) {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) yield* filesBelow(path);
    else yield path;
  }
}

async function sweepFolder(folder: string, olderThanMs: number): Promise<number> {
  let swept = 0;
  for (const name of await readdir(folder)) {
    const facts = await stat(join(folder, name)).catch(() => null);
    if (facts === null || Date.now() - facts.mtimeMs < olderThanMs) continue;
    await rm(join(folder, name), { force: true });
    swept += 1;
  }
  return swept;
}

/** A folder as object store: bytes go to a temporary file, are synced to disk and then renamed into place. */
export async function openFolderStore(folder: string): Promise<ObjectStore> {
  const [keptFolder, temporaryFolder] = [join(folder, 'kept'), join(folder, 'temporary')];
  await Promise.all([mkdir(keptFolder, { recursive: true, mode: 0o700 }), mkdir(temporaryFolder, { recursive: true, mode: 0o700 })]);
  const placeOf = (key: string): string => {
    if (!wellFormedKey.test(key)) throw new Error(`"${key}" is no key of an object.`);
    return join(keptFolder, ...key.split('/'));
  };
  const temporaryPlace = (object: Pick<TemporaryObject, 'temporaryName'>): string => join(temporaryFolder, object.temporaryName);

  const putTemporary = async (source: Readable): Promise<TemporaryObject> => {
    const temporaryName = randomUUID();
    const path = temporaryPlace({ temporaryName });
    const hash = createHash('sha256');
    let byteCount = 0;
    try {
      await pipeline(source, async function* (chunks: AsyncIterable<Buffer>) {
        for await (const chunk of chunks) {
          hash.update(chunk);
          byteCount += chunk.length;
          yield chunk;
        }
      }, createWriteStream(path, { flags: 'wx', mode: 0o600, flush: true }));
    } catch (fault) {
      await rm(path, { force: true });
      throw fault;
    }
    return { temporaryName, byteCount, sha256: hash.digest('hex') };
  };

  const keep = async (object: TemporaryObject, key: string): Promise<void> => {
    const place = placeOf(key);
    await mkdir(dirname(place), { recursive: true, mode: 0o700 });
    await rename(temporaryPlace(object), place);
    await syncFolder(dirname(place));
  };

  return {
    putTemporary, keep,
    sweepTemporary: (olderThanMs) => sweepFolder(temporaryFolder, olderThanMs),
    discard: (object) => rm(temporaryPlace(object), { force: true }),
    read: async (key) => readFile(placeOf(key)).catch((fault: unknown) => {
      if (isMissing(fault)) return null;
      throw fault;
    }),
    openStream: async (key) => {
      const place = placeOf(key);
      const facts = await stat(place).catch(() => null);
      return facts === null ? null : createReadStream(place);
    },
    listKeys: async function* () {
      for await (const path of filesBelow(keptFolder)) yield relative(keptFolder, path).split(sep).join('/');
    },
    check: () => access(temporaryFolder, constants.W_OK),
  };
}
