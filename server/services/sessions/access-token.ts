import { sign, verify } from 'jsonwebtoken';
import { z } from 'zod';

/** Seconds that an access token lives; what it may do is looked up at each call. */
export const accessSeconds = 600;

const claims = z.object({ sub: z.uuid(), sid: z.uuid() });
const algorithm = 'HS256';
const audience = 'stepwell-app';

/** Short-lived JWTs that name a session: one algorithm, one issuer, one audience. */
export class AccessTokens {
  constructor(
    private readonly secret: Buffer,
    private readonly issuer: string,
  ) {}

  of(personId: string, sessionId: string): string {
    return sign({ sid: sessionId }, this.secret, {
      algorithm,
      audience,
      issuer: this.issuer,
      subject: personId,
      expiresIn: accessSeconds,
    });
  }

  /** The session a token names, or undefined where it is not one of ours or has expired. */
  read(token: string): { personId: string; sessionId: string } | undefined {
    try {
      const verified = verify(token, this.secret, {
        algorithms: [algorithm],
        audience,
        issuer: this.issuer,
      });
      const { sub, sid } = claims.parse(verified);
      return { personId: sub, sessionId: sid };
    } catch {
      return undefined;
    }
  }
}
