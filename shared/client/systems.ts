import type { StoredSystem, SystemList, SystemSummary } from '../stored-system';
import { readPage, type Page } from './page';
import type { CallOptions, Send } from './send';

interface Search {
  readonly query?: string;
  readonly limit?: number;
  /** Of the page before. */
  readonly cursor?: string;
}

const addressed = (path: string, search: Search) => {
  const query = new URLSearchParams(
    Object.entries(search).map(([name, value]) => [name, String(value)]),
  ).toString();
  return query === '' ? path : `${path}?${query}`;
};

/** Finding and reading stored systems under a path; `next` is the cursor of the page after. */
export const systemsAt = (send: Send, path: string) => ({
  find: async (search: Search = {}, { signal }: CallOptions = {}): Promise<Page<SystemSummary>> =>
    readPage<SystemList>(await send({ method: 'GET', path: addressed(path, search), signal })),
  read: async (id: string, { signal }: CallOptions = {}): Promise<StoredSystem> => {
    const answer = await send({ method: 'GET', path: `${path}/${encodeURIComponent(id)}`, signal });
    return (await answer.json()) as StoredSystem;
  },
});
