import { createHash } from 'node:crypto';
import { Transform, type Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import busboy, { type Busboy } from 'busboy';
import { uploadFieldSchemas, uploadLimits, type UploadFieldName, type UploadFields } from '@leeside/contracts/files';
import type { ObjectStore, TemporaryObject } from '@leeside/object-store/object-store';
import type { Request } from 'express';
import { cleanFileName } from './clean-file-name.js';
import { badRequest, HttpProblem } from './http-problem.js';

/** A file that has arrived whole, with the fields that stood before it. */
export interface ArrivedFile {
  readonly name: string;
  readonly object: TemporaryObject;
  readonly fields: UploadFields;
}

const idleMs = 20_000;
const tooLarge = (): HttpProblem => new HttpProblem(413, 'too-large', 'Too large', `A file may have ${uploadLimits.fileBytes / 1024 ** 2} MiB and a request ${uploadLimits.requestBytes / 1024 ** 3} GiB. Nothing was kept.`);
const cutOff = (): HttpProblem => badRequest('upload-incomplete', 'The upload was cut off. Send it again; nothing was kept.');

function openForm(request: Request): Busboy {
  if (request.is('multipart/form-data') === false) throw new HttpProblem(415, 'unsupported-media-type', 'Unsupported media type', 'Send files as multipart/form-data, for example: curl -F role=reference -F file=@sweep.csv');
  if (request.get('Content-Encoding') !== undefined) throw new HttpProblem(415, 'unsupported-encoding', 'Unsupported encoding', 'Uploads are taken as they are, without Content-Encoding.');
  if (Number(request.get('Content-Length') ?? 0) > uploadLimits.requestBytes) throw tooLarge();
  try {
    return busboy({
      headers: request.headers, defParamCharset: 'utf8', preservePath: false,
      limits: { fileSize: uploadLimits.fileBytes, files: uploadLimits.filesPerRequest, fields: uploadLimits.fieldsPerRequest, fieldSize: 4096, fieldNameSize: 100, headerPairs: 50 },
    });
  } catch {
    throw new HttpProblem(415, 'unsupported-media-type', 'Unsupported media type', 'The multipart body has no usable boundary. For example: curl -F role=reference -F file=@sweep.csv');
  }
}

/** The fields in force: each describes the files after it until it is repeated; an empty one clears it. */
function makeFieldMemory() {
  const inForce = new Map<UploadFieldName, unknown>();
  return {
    set: (name: string, value: string): void => {
      if (!Object.hasOwn(uploadFieldSchemas, name)) throw badRequest('unknown-field', `There is no field "${name.slice(0, 100)}".`);
      const field = name as UploadFieldName;
      if (value === '') {
        inForce.delete(field);
        return;
      }
      const parsed = uploadFieldSchemas[field].safeParse(value);
      if (!parsed.success) throw new HttpProblem(400, 'invalid-field', 'A field is not as it should be', `${field}: "${value.slice(0, 100)}" cannot be taken.`, { errors: [{ pointer: `/${field}`, code: 'invalid', message: `"${value.slice(0, 100)}" cannot be taken.` }] });
      inForce.set(field, parsed.data);
    },
    current: (): UploadFields => Object.fromEntries(inForce),
  };
}

/** Passes bytes on and fails where none come for a while, or where the digest that was promised is not met. */
function watchBytes(request: Request): Transform {
  const wanted = /sha-256=:([A-Za-z0-9+/=]+):/.exec(request.get('Content-Digest') ?? '')?.[1];
  const hash = wanted === undefined ? null : createHash('sha256');
  let byteCount = 0;
  const watch = new Transform({
    transform(chunk: Buffer, _encoding, done) {
      byteCount += chunk.length;
      hash?.update(chunk);
      timer.refresh();
      done(byteCount > uploadLimits.requestBytes ? tooLarge() : null, chunk);
    },
    flush(done) {
      clearTimeout(timer);
      const found = hash?.digest('base64');
      done(found === undefined || found === wanted ? null : new HttpProblem(422, 'checksum-mismatch', 'The bytes are not those that were sent', `Content-Digest promised ${wanted}, ${found} arrived. Nothing was kept.`));
    },
  });
  const timer = setTimeout(() => watch.destroy(new HttpProblem(408, 'upload-too-slow', 'Too slow', 'No byte arrived for 20 seconds. Send it again; nothing was kept.', { headers: { Connection: 'close' } })), idleMs);
  watch.on('close', () => clearTimeout(timer));
  return watch;
}

interface Collected {
  readonly files: Promise<ArrivedFile>[];
  fieldAfterLastFile: boolean;
  /** The first thing that was wrong. */
  fault: Error | null;
}

/** Listens to the form's parts; a fault destroys the form with it. */
function collectParts(form: Busboy, store: ObjectStore): Collected {
  const fields = makeFieldMemory();
  const collected: Collected = { files: [], fieldAfterLastFile: false, fault: null };
  /** The form may not be destroyed from within its own events: it is still taking a chunk apart. */
  const fail = (fault: Error): void => {
    collected.fault ??= fault;
    setImmediate(() => form.destroy(fault));
  };
  const open = new Set<Readable>();
  form.once('close', () => open.forEach((stream) => stream.destroy()));
  form.on('field', (name, value, info) => {
    collected.fieldAfterLastFile = true;
    try {
      if (info.nameTruncated || info.valueTruncated) throw badRequest('invalid-field', 'A field is longer than 4 KiB.');
      fields.set(name, value);
    } catch (fault) {
      fail(fault instanceof Error ? fault : new Error('A field could not be taken.'));
    }
  });
  form.on('file', (part, stream: Readable, info) => {
    if (part !== 'file') fail(badRequest('unknown-field', `Files are sent as "file", not "${part.slice(0, 100)}".`));
    if (collected.fault !== null) {
      stream.on('error', () => undefined).resume();
      return;
    }
    collected.fieldAfterLastFile = false;
    const { name } = cleanFileName(info.filename ?? '');
    const inForce = fields.current();
    stream.on('limit', () => fail(tooLarge()));
    const arrived = store.putTemporary(stream).then((object) => ({ name, object, fields: inForce }));
    arrived.catch(fail);
    collected.files.push(arrived);
    open.add(stream);
    stream.once('close', () => open.delete(stream));
  });
  form.on('filesLimit', () => fail(badRequest('too-many-files', `A request takes ${uploadLimits.filesPerRequest} files. Nothing was kept.`)));
  form.on('fieldsLimit', () => fail(badRequest('too-many-fields', `A request takes ${uploadLimits.fieldsPerRequest} fields. Nothing was kept.`)));
  return collected;
}

function faultOfForm(fault: unknown): unknown {
  if (fault instanceof HttpProblem) return fault;
  const words = fault instanceof Error ? fault.message : '';
  if (/Unexpected end of form|aborted|Premature close|ECONNRESET/i.test(words)) return cutOff();
  if (/Malformed|boundary|header/i.test(words)) return badRequest('malformed-upload', 'The multipart body is malformed. Nothing was kept.');
  return fault;
}

/**
 * Takes the files of a form into the object store, hashing on the way. All arrive or none: after any fault nothing is left.
 * @returns the files in their order, not yet kept under their keys.
 */
export async function receiveFiles(request: Request, store: ObjectStore): Promise<ArrivedFile[]> {
  const form = openForm(request);
  const collected = collectParts(form, store);
  try {
    const watch = watchBytes(request);
    watch.once('error', (fault) => {
      collected.fault ??= fault;
    });
    await pipeline(request, watch, form);
    if (collected.fault !== null) throw collected.fault;
    const files = await Promise.all(collected.files);
    if (files.length === 0) throw badRequest('no-file', 'The form holds no file.');
    if (collected.fieldAfterLastFile) throw badRequest('fields-after-last-file', 'A field describes the files after it; this form ends with a field.');
    return files;
  } catch (fault) {
    const settled = await Promise.allSettled(collected.files);
    await Promise.all(settled.flatMap((one) => (one.status === 'fulfilled' ? [store.discard(one.value.object)] : [])));
    throw faultOfForm(collected.fault ?? fault);
  }
}
