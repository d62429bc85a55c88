import { z, type ZodType } from 'zod';
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

const place = z.tuple([z.iso.datetime(), z.uuid()]);

/** Where a list that is newest first was left: at a row, by its moment and id. */
export const writePlace = (at: string, id: string): string => writeCursor([at, id]);

/** The row that a page comes after; undefined for the first page. */
export function readPlace(cursor: string | undefined): { at: Date; id: string } | undefined {
  if (cursor === undefined) return undefined;
  const [at, id] = readCursor(cursor, place);
  return { at: new Date(at), id };
}

/** RFC 8288 `Link` to the next page, as a header. */
export function nextLink(path: string, query: Readonly<Record<string, string | undefined>>) {
  const given = Object.entries(query).filter(([, value]) => value !== undefined);
  const parameters = new URLSearchParams(given as [string, string][]).toString();
  return { Link: `<${path}?${parameters}>; rel="next"` };
}
