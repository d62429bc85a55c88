import { keepPreviousData, useInfiniteQuery, useQuery } from '@tanstack/react-query';
import { createClient, type ProblemError } from '../../shared/client';
import type { StoredSystem } from '../../shared/stored-system';
import { useSettled } from '../ui/use-settled';

const client = createClient({ baseUrl: '' });

/** A search is asked for once the typing rests, ms. */
const typingRest = 200;
/** The longest query that the contract takes. */
const longest = 100;

/** The text as a query; undefined for all systems. */
const queryOf = (text: string) => text.replaceAll('\u0000', '').trim().slice(0, longest).trim();

/**
 * Systems found by name, alias, formula or CAS number, best matches first; all by name without a
 * text. The last ones stay until the new ones are there: `isCurrent` says which these are.
 */
export function useSystemSearch(text: string, limit: number) {
  const wanted = queryOf(text);
  const settled = useSettled(wanted, typingRest);
  const search = useInfiniteQuery({
    queryKey: ['systems', settled, limit],
    queryFn: ({ pageParam, signal }) =>
      client.publicSystems.find(
        { query: settled === '' ? undefined : settled, limit, cursor: pageParam },
        { signal },
      ),
    initialPageParam: undefined as string | undefined,
    getNextPageParam: ({ next }) => next,
    placeholderData: keepPreviousData,
    staleTime: Infinity,
  });
  return {
    ...search,
    systems: search.data?.pages.flatMap(({ items }) => items),
    query: settled,
    isCurrent: wanted === settled && search.isSuccess && !search.isPlaceholderData,
  };
}

export type SystemSearch = ReturnType<typeof useSystemSearch>;

/** One system with every determination. */
export const useSystem = (id: string) =>
  useQuery<StoredSystem, ProblemError>({
    queryKey: ['system', id],
    queryFn: ({ signal }) => client.publicSystems.read(id, { signal }),
    staleTime: Infinity,
  });
