import { createHash, createHmac, randomBytes, timingSafeEqual } from 'node:crypto';
import { z } from 'zod';

export const digestOf = (token: string): Buffer => createHash('sha256').update(token).digest();

/**
 * Refresh tokens: a session's id, 256 random bits, and a code that only we can make. Of the whole
 * only a digest is stored. Without the code whoever learnt a session's id, from an exported audit
 * say, could end it by a token of the past that never was.
 */
export class RefreshTokens {
  private readonly secret: Buffer;

  constructor(sessionSecret: Buffer) {
    // Apart from the secret of access tokens, so that neither is ever good for the other.
    this.secret = createHmac('sha256', sessionSecret).update('refresh tokens').digest();
  }

  of(sessionId: string): string {
    const body = `${sessionId}.${randomBytes(32).toString('base64url')}`;
    return `${body}.${this.codeOf(body)}`;
  }

  /** The session a token of ours names, whether or not the token is still good. */
  sessionOf(token: string): string | undefined {
    const [id = '', random = '', code = '', ...rest] = token.split('.');
    const [given, own] = [Buffer.from(code), Buffer.from(this.codeOf(`${id}.${random}`))];
    const isOurs = rest.length === 0 && given.length === own.length && timingSafeEqual(given, own);
    return isOurs ? z.uuid().safeParse(id).data : undefined;
  }

  private readonly codeOf = (body: string): string =>
    createHmac('sha256', this.secret).update(body).digest().subarray(0, 16).toString('base64url');
}
