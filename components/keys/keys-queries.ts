import {
  useInfiniteQuery,
  useMutation,
  useQueryClient,
  type InfiniteData,
} from '@tanstack/react-query';
import { createClient, type Page, type ProblemError } from '../../shared/client';
import type { IssuedKey, KeyAnswer, KeyRequestInput } from '../../shared/keys';

const client = createClient({ baseUrl: '' });
const queryKey = ['keys'] as const;
type Pages = InfiniteData<Page<KeyAnswer>>;

/** The keys this person may see, newest first, page by page. */
export const useKeys = () =>
  useInfiniteQuery({
    queryKey,
    queryFn: ({ pageParam, signal }) => client.keys(pageParam, { signal }),
    initialPageParam: undefined as string | undefined,
    getNextPageParam: ({ next }) => next,
    // Back from the terminal, where the key was tried: its last use is news.
    refetchOnWindowFocus: true,
  });

export function useIssueKey() {
  const queryClient = useQueryClient();
  return useMutation<IssuedKey, ProblemError, KeyRequestInput>({
    mutationKey: ['issue-key'],
    mutationFn: (body) => client.issueKey(body),
    // The key goes with the dialog that shows it: nothing else holds it.
    gcTime: 0,
    // Also after a failure: a key whose answer was lost on the way is in the list.
    onSettled: () => void queryClient.invalidateQueries({ queryKey }),
  });
}

export function useRevokeKey() {
  const queryClient = useQueryClient();
  return useMutation<KeyAnswer, ProblemError, string>({
    mutationFn: (id) => client.revokeKey(id),
    onSuccess: (revoked) =>
      queryClient.setQueryData<Pages>(
        queryKey,
        (before) =>
          before && {
            ...before,
            pages: before.pages.map((page) => ({
              ...page,
              items: page.items.map((key) => (key.id === revoked.id ? revoked : key)),
            })),
          },
      ),
  });
}
