import { createHash, randomBytes } from 'node:crypto';
import { z } from 'zod';

/** A refresh token of a session: its id and 256 random bits. Only a digest is stored. */
export const makeRefreshToken = (sessionId: string): string =>
  `${sessionId}.${randomBytes(32).toString('base64url')}`;

/** The session a token names, whether or not the token is good; undefined where it is none. */
export const sessionOfToken = (token: string): string | undefined =>
  z.uuid().safeParse(token.split('.')[0]).data;

export const digestOf = (token: string): Buffer => createHash('sha256').update(token).digest();
