import { createHash } from 'node:crypto';
import { mkdtemp, readdir, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Readable } from 'node:stream';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { openFolderStore } from './folder-store.js';
import { rawFileKey, type ObjectStore } from './object-store.js';

const labId = '11111111-1111-4111-8111-111111111111';
const bytes = Buffer.from('1000000,-31.5\n2000000,-32.5\n');
const sha256 = createHash('sha256').update(bytes).digest('hex');

describe('the folder as object store', () => {
  let folder: string;
  let store: ObjectStore;
  beforeEach(async () => {
    folder = await mkdtemp(join(tmpdir(), 'object-store-'));
    store = await openFolderStore(folder);
  });
  afterEach(() => rm(folder, { recursive: true }));
  const keys = async (): Promise<string[]> => {
    const found: string[] = [];
    for await (const key of store.listKeys()) found.push(key);
    return found;
  };
  const temporaries = (): Promise<string[]> => readdir(join(folder, 'temporary'));

  test('what is kept is read back to the byte, with its hash and size', async () => {
    const object = await store.putTemporary(Readable.from([bytes.subarray(0, 5), bytes.subarray(5)]));
    expect(object).toMatchObject({ sha256, byteCount: bytes.length });
    await store.keep(object, rawFileKey(labId, sha256));
    expect(Buffer.from((await store.read(rawFileKey(labId, sha256))) ?? [])).toEqual(bytes);
    expect(await keys()).toEqual([rawFileKey(labId, sha256)]);
    expect(await temporaries()).toEqual([]);
  });

  test('keeping the same bytes twice leaves one object', async () => {
    for (const round of [1, 2]) await store.keep(await store.putTemporary(Readable.from([bytes])), rawFileKey(labId, sha256)).then(() => round);
    expect(await keys()).toHaveLength(1);
  });

  test('a stream that breaks off leaves nothing', async () => {
    const broken = Readable.from((function* () {
      yield bytes;
      throw new Error('cut off');
    })());
    await expect(store.putTemporary(broken)).rejects.toThrow('cut off');
    expect(await temporaries()).toEqual([]);
  });

  test('discarded and forgotten objects go, fresh ones stay', async () => {
    await store.discard(await store.putTemporary(Readable.from([bytes])));
    await store.putTemporary(Readable.from([bytes]));
    expect(await store.sweepTemporary(60_000)).toBe(0);
    expect(await store.sweepTemporary(-1)).toBe(1);
    expect(await temporaries()).toEqual([]);
  });

  test('an object that is not there is null, and a key cannot leave the folder', async () => {
    expect(await store.read(rawFileKey(labId, sha256))).toBeNull();
    expect(await store.openStream(rawFileKey(labId, sha256))).toBeNull();
    await expect(store.read('labs/../../etc/passwd')).rejects.toThrow('no key');
  });
});
