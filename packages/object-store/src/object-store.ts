import type { Readable } from 'node:stream';

/** Bytes that have arrived whole but are not kept yet. */
export interface TemporaryObject {
  readonly temporaryName: string;
  readonly byteCount: number;
  readonly sha256: string;
}

/** Where raw files lie: immutable, under a key that is made from their hash. */
export interface ObjectStore {
  /** Takes a stream in, hashing on the way; a stream that fails leaves nothing behind. */
  putTemporary(source: Readable): Promise<TemporaryObject>;
  /** Keeps what was taken in under its key; the same key again is harmless. */
  keep(object: TemporaryObject, key: string): Promise<void>;
  /** Drops what was taken in and is not wanted. */
  discard(object: TemporaryObject): Promise<void>;
  /** All bytes of an object; null where there is none. */
  read(key: string): Promise<Uint8Array | null>;
  /** The bytes as a stream; null where there is no object. */
  openStream(key: string): Promise<Readable | null>;
  /** Every key that is kept. */
  listKeys(): AsyncIterable<string>;
  /** Deletes what was taken in longer ago than this and never kept; answers how many. */
  sweepTemporary(olderThanMs: number): Promise<number>;
  /** Whether objects can be written now. */
  check(): Promise<void>;
}

/** Key of a raw file: one object a lab and hash, so that nothing is shared across labs. */
export function rawFileKey(labId: string, sha256: string): string {
  return `labs/${labId}/${sha256}`;
}
