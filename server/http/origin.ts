import type { Request } from 'express';
import { Refusal } from '../refusal';

const safe = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Requests that change something and rest on cookies must come from our own pages: by `Origin`, or
 * where a browser leaves that out by `Sec-Fetch-Site`. Neither is a refusal too.
 */
export function requireOwnOrigin(request: Request, origins: ReadonlySet<string>): void {
  if (safe.has(request.method)) return;
  const { origin, 'sec-fetch-site': site } = request.headers;
  const ours = origin === undefined ? site === 'same-origin' : origins.has(origin);
  if (!ours) throw new Refusal('origin-refused', 'Send it from our own pages, or use a key.');
}

/** Origins of our own pages: PUBLIC_URL, and outside production this machine by its other name. */
export function ownOrigins(publicUrl: string, isProduction: boolean): ReadonlySet<string> {
  const url = new URL(publicUrl);
  if (isProduction || url.hostname !== 'localhost') return new Set([url.origin]);
  return new Set([url.origin, url.origin.replace('localhost', '127.0.0.1')]);
}
