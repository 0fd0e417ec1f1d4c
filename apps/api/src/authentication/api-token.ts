import { createHash, randomBytes } from 'node:crypto';

const alphabet = '0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz';
const bodyLength = 43;
const checksumLength = 6;

function base62(bytes: Buffer, length: number): string {
  let value = BigInt(`0x${bytes.toString('hex')}`);
  let text = '';
  for (let at = 0; at < length; at += 1) {
    text += alphabet[Number(value % 62n)] ?? '';
    value /= 62n;
  }
  return text;
}

const checksumOf = (body: string): string => base62(createHash('sha256').update(body).digest(), checksumLength);

/** A token for programs: 43 random characters and a checksum, so that a scanner can tell one from noise. */
export function makeApiToken(): string {
  const body = base62(randomBytes(40), bodyLength);
  return `leeside_${body}${checksumOf(body)}`;
}

/** Whether a text can be one of our tokens at all. */
export function looksLikeApiToken(text: string): boolean {
  const parts = /^leeside_([0-9A-Za-z]{43})([0-9A-Za-z]{6})$/.exec(text);
  return parts !== null && checksumOf(parts[1] ?? '') === parts[2];
}
