/** Bytes of UTF-16, with or without its mark. */
export function utf16(text: string, order: 'little' | 'big', hasMark = true): Uint8Array {
  const marked = hasMark ? `\ufeff${text}` : text;
  const bytes = new Uint8Array(marked.length * 2);
  const view = new DataView(bytes.buffer);
  for (let at = 0; at < marked.length; at += 1) view.setUint16(at * 2, marked.charCodeAt(at), order === 'little');
  return bytes;
}

/** Bytes of UTF-8. */
export function utf8(text: string): Uint8Array {
  return new TextEncoder().encode(text);
}

/** One byte a sign, for texts of Western letters. */
export function latin1(text: string): Uint8Array {
  return Uint8Array.from(text, (sign) => sign.charCodeAt(0));
}

/** Bytes from pieces of text and raw bytes. */
export function joined(...parts: readonly (string | readonly number[])[]): Uint8Array {
  return Uint8Array.from(parts.flatMap((part) => (typeof part === 'string' ? [...utf8(part)] : part)));
}
