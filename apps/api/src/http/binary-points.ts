import type { Request } from 'express';

/** Whether the caller asked for points as bytes. */
export function wantsBinary(request: Request): boolean {
  return request.accepts(['application/json', 'application/octet-stream']) === 'application/octet-stream';
}

/** uint32 count, uint32 number of columns, float64 frequencies, float32 columns; all little-endian. */
export function packPoints(frequencyHz: Float64Array, columns: readonly ArrayLike<number>[]): Buffer {
  const count = frequencyHz.length;
  const bytes = Buffer.alloc(8 + count * 8 + columns.length * count * 4);
  bytes.writeUInt32LE(count, 0);
  bytes.writeUInt32LE(columns.length, 4);
  frequencyHz.forEach((frequency, at) => bytes.writeDoubleLE(frequency, 8 + at * 8));
  columns.forEach((column, place) => {
    const start = 8 + count * 8 + place * count * 4;
    for (let at = 0; at < count; at += 1) bytes.writeFloatLE(column[at] ?? NaN, start + at * 4);
  });
  return bytes;
}
