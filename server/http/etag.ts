import { createHash } from 'node:crypto';
import type { Reply } from './operation';

/** A strong ETag (RFC 9110 §8.8.3): the same for the same bytes, and for no others. */
const etagOf = (body: Uint8Array | string): string =>
  `"${createHash('sha256').update(body).digest('base64url').slice(0, 27)}"`;

/** Whether If-None-Match names what would be answered (RFC 9110 §13.1.2: compared weakly). */
function isHeld(ifNoneMatch: string | undefined, etag: string): boolean {
  const named = (ifNoneMatch ?? '').match(/\*|"[^"]*"/g) ?? [];
  return named.some((one) => one === '*' || one === etag);
}

interface Asked {
  readonly ifNoneMatch: string | undefined;
  /** Whether caches between may keep the answer. */
  readonly shared: boolean;
}

/** The reply with its ETag, or a 304 where the caller holds the same already. */
export function revalidated(reply: Reply, { ifNoneMatch, shared }: Asked): Reply {
  const etag = etagOf(reply.body ?? '');
  const cacheControl = shared ? 'no-cache' : 'private, no-cache';
  const headers = { ...reply.headers, ETag: etag, 'Cache-Control': cacheControl };
  return isHeld(ifNoneMatch, etag) ? { status: 304, headers } : { ...reply, headers };
}
