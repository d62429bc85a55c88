import type { CookieOptions, Request, Response } from 'express';
import { accessSeconds } from '../services/sessions/access-token';
import { sessionDays, type Tokens } from '../services/sessions/session-service';

/**
 * The two cookies of a session: out of reach of scripts, never sent across sites, and under HTTPS
 * bound to this host by their names.
 */
export class SessionCookies {
  private readonly access: string;
  private readonly refresh: string;
  private readonly options: CookieOptions;

  constructor(https: boolean) {
    const prefix = https ? '__Host-' : '';
    this.access = `${prefix}stepwell_access`;
    this.refresh = `${prefix}stepwell_refresh`;
    this.options = { httpOnly: true, secure: https, sameSite: 'strict', path: '/' };
  }

  read(request: Request): Partial<Tokens> {
    const cookies = request.cookies as Record<string, unknown>;
    const text = (name: string) => {
      const value = cookies[name];
      return typeof value === 'string' ? value : undefined;
    };
    const access = text(this.access);
    const refresh = text(this.refresh);
    return { ...(access && { access }), ...(refresh && { refresh }) };
  }

  set(response: Response, { access, refresh }: Partial<Tokens> & Pick<Tokens, 'access'>): void {
    const { options } = this;
    response.cookie(this.access, access, { ...options, maxAge: accessSeconds * 1_000 });
    if (refresh === undefined) return;
    response.cookie(this.refresh, refresh, { ...options, maxAge: sessionDays * 86_400_000 });
  }

  clear(response: Response): void {
    response.clearCookie(this.access, this.options).clearCookie(this.refresh, this.options);
  }
}
