import type { StoredSystem, SystemList, SystemSummary } from '../stored-system';
import { readPage, type Page } from './page';
import type { CallOptions, Send } from './send';

interface Search {
  readonly query?: string | undefined;
  readonly limit?: number | undefined;
  /** Of the page before. */
  readonly cursor?: string | undefined;
}

function addressed(path: string, search: Search): string {
  const parameters = new URLSearchParams();
  for (const [name, value] of Object.entries(search)) {
    if (value !== undefined) parameters.set(name, String(value));
  }
  const query = parameters.toString();
  return query === '' ? path : `${path}?${query}`;
}

/** Finding and reading stored systems under a path; `next` is the cursor of the page after. */
export const systemsAt = (send: Send, path: string) => ({
  find: async (search: Search = {}, { signal }: CallOptions = {}): Promise<Page<SystemSummary>> =>
    readPage<SystemList>(await send({ method: 'GET', path: addressed(path, search), signal })),
  read: async (id: string, { signal }: CallOptions = {}): Promise<StoredSystem> => {
    const answer = await send({ method: 'GET', path: `${path}/${encodeURIComponent(id)}`, signal });
    return (await answer.json()) as StoredSystem;
  },
});
