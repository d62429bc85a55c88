import {
  infiniteQueryOptions,
  keepPreviousData,
  queryOptions,
  useInfiniteQuery,
  useQuery,
  useQueryClient,
} from '@tanstack/react-query';
import { createClient, type ProblemError } from '../../shared/client';
import type { StoredSystem } from '../../shared/stored-system';
import { useSettled } from '../ui/use-settled';

const client = createClient({ baseUrl: '' });

/** A search is asked for once the typing rests, ms. */
const typingRest = 200;
/** The longest query that the contract takes. */
const longest = 100;

/** The text as a query; empty for all systems. */
const queryOf = (text: string) => text.replaceAll('\u0000', '').trim().slice(0, longest).trim();

const searchOptions = (query: string, limit: number) =>
  infiniteQueryOptions({
    queryKey: ['systems', query, limit],
    queryFn: ({ pageParam, signal }) =>
      client.publicSystems.find(
        { query: query === '' ? undefined : query, limit, cursor: pageParam },
        { signal },
      ),
    initialPageParam: undefined as string | undefined,
    getNextPageParam: ({ next }) => next,
    staleTime: Infinity,
  });

/**
 * Systems found by name, alias, formula or CAS number, best matches first; all by name without a
 * text. The last ones stay until the new ones are there: `isCurrent` says which these are.
 */
export function useSystemSearch(text: string, limit: number, enabled = true) {
  const queryClient = useQueryClient();
  const wanted = queryOf(text);
  const settled = useSettled(wanted, typingRest);
  const search = useInfiniteQuery({
    ...searchOptions(settled, limit),
    placeholderData: keepPreviousData,
    enabled,
  });
  return {
    ...search,
    systems: search.data?.pages.flatMap(({ items }) => items),
    /** What was searched for. */
    query: settled,
    isCurrent: wanted === settled && search.isSuccess && !search.isPlaceholderData,
    /** The best match, for somebody who does not wait for the list; undefined where there is none. */
    first: async () => {
      const { pages } = await queryClient.fetchInfiniteQuery(searchOptions(wanted, limit));
      return pages[0]?.items[0];
    },
  };
}

export type SystemSearch = ReturnType<typeof useSystemSearch>;

export const systemQuery = (id: string) =>
  queryOptions<StoredSystem, ProblemError>({
    queryKey: ['system', id],
    queryFn: ({ signal }) => client.publicSystems.read(id, { signal }),
    staleTime: Infinity,
  });

/** One system with every determination. */
export const useSystem = (id: string) => useQuery(systemQuery(id));
