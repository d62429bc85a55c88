/** One page of a list, and the cursor of the next. */
export interface Page<Item> {
  readonly items: readonly Item[];
  readonly next: string | undefined;
}

/** Reads a list and the cursor in its `Link: rel="next"` (RFC 8288). */
export async function readPage<List extends { items: readonly unknown[] }>(
  response: Response,
): Promise<Page<List['items'][number]>> {
  const { items } = (await response.json()) as List;
  const link = /<([^>]*)>; *rel="next"/.exec(response.headers.get('Link') ?? '')?.[1];
  const query = link?.slice(link.indexOf('?') + 1);
  return { items, next: new URLSearchParams(query).get('cursor') ?? undefined };
}
