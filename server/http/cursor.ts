import type { ZodType } from 'zod';
import { Refusal } from '../refusal';

/** A keyset cursor as the caller sees it: opaque, safe in an address. */
export const writeCursor = (position: unknown): string =>
  Buffer.from(JSON.stringify(position)).toString('base64url');

/** The position of a cursor of ours; anything else is a 400. */
export function readCursor<T>(cursor: string, schema: ZodType<T>): T {
  try {
    return schema.parse(JSON.parse(Buffer.from(cursor, 'base64url').toString()));
  } catch {
    throw new Refusal('invalid-request', 'Take the cursor from the last page as it is.', [
      { pointer: '?cursor', code: 'not-a-cursor', detail: 'This is no cursor of ours.' },
    ]);
  }
}

/** RFC 8288 `Link` to the next page, as a header. */
export const nextLink = (path: string, query: Readonly<Record<string, string>>) => ({
  Link: `<${path}?${new URLSearchParams(query).toString()}>; rel="next"`,
});
