import { createHash, randomBytes } from 'node:crypto';

/** A random refresh token of 256 bits; only its digest is stored. */
export const makeRefreshToken = (): string => randomBytes(32).toString('base64url');

export const digestOf = (token: string): Buffer => createHash('sha256').update(token).digest();
