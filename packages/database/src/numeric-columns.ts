/** Arrays to and from `bytea`, little-endian whatever the machine. */

const isLittleEndian = new Uint8Array(Uint16Array.of(1).buffer)[0] === 1;

function littleEndian(bytes: Buffer, width: 4 | 8): Buffer {
  if (isLittleEndian) return bytes;
  const copy = Buffer.from(bytes);
  return width === 4 ? copy.swap32() : copy.swap64();
}

/** Float32 values as bytes. */
export function packFloat32(values: Float32Array): Buffer {
  return littleEndian(Buffer.from(values.buffer, values.byteOffset, values.byteLength), 4);
}

/** Float64 values as bytes. */
export function packFloat64(values: Float64Array): Buffer {
  return littleEndian(Buffer.from(values.buffer, values.byteOffset, values.byteLength), 8);
}

function alignedCopy(bytes: Buffer): ArrayBuffer {
  const copy = new ArrayBuffer(bytes.length);
  new Uint8Array(copy).set(bytes);
  return copy;
}

/** Bytes as float32 values, in memory of their own. */
export function unpackFloat32(bytes: Buffer): Float32Array {
  return new Float32Array(alignedCopy(littleEndian(bytes, 4)));
}

/** Bytes as float64 values, in memory of their own. */
export function unpackFloat64(bytes: Buffer): Float64Array {
  return new Float64Array(alignedCopy(littleEndian(bytes, 8)));
}
