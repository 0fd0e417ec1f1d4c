import { createHash, randomBytes } from 'node:crypto';

/** 256 bits, for cookies and links. */
export const randomToken = (): string => randomBytes(32).toString('base64url');

/** Only hashes of tokens are kept. */
export const hashToken = (token: string): Buffer => createHash('sha256').update(token).digest();
