import {
  queryOptions,
  useMutation,
  useQuery,
  useQueryClient,
  type QueryClient,
} from '@tanstack/react-query';
import { useEffect, useRef } from 'react';
import type { AccountAnswer, SignInRequest } from '../../shared/account';
import { createClient, ProblemError } from '../../shared/client';
import { sameStanding, whoOf, withoutSession, type Session } from './session';
import { isSessionNoted, noteSession, onSessionNoted } from './session-mark';

const client = createClient({ baseUrl: '' });
const queryKey = ['session'] as const;
const nobody: Session = { state: 'nobody' };
const signedIn = (who: AccountAnswer): Session => ({ state: 'signed-in', who });

const isStatus = (error: unknown, status: number) =>
  error instanceof ProblemError && error.problem.status === status;

const sessionQuery = (queryClient: QueryClient) =>
  queryOptions<Session, ProblemError>({
    queryKey,
    queryFn: async ({ signal }) => {
      const before = queryClient.getQueryData<Session>(queryKey);
      if (!isSessionNoted()) return withoutSession(before);
      try {
        return signedIn(await client.account({ signal }));
      } catch (error) {
        if (!isStatus(error, 401)) throw error;
        noteSession(undefined);
        return withoutSession(before);
      }
    },
    ...(!isSessionNoted() && { initialData: nobody }),
    staleTime: Infinity,
  });

/** Who is signed in; no data until that is known. */
export const useSession = () => useQuery(sessionQuery(useQueryClient()));

/**
 * Follows what other tabs do with the session, and drops what was fetched for another person,
 * organization or role. Once for the whole app.
 */
export function useSessionKeeper(): void {
  const queryClient = useQueryClient();
  const { data: session } = useSession();
  const who = whoOf(session);
  const earlier = useRef(who);
  useEffect(
    () => onSessionNoted(() => void queryClient.invalidateQueries({ queryKey })),
    [queryClient],
  );
  // After the places have been drawn for the new standing: what is gone from them is not fetched.
  useEffect(() => {
    const before = earlier.current;
    earlier.current = who ?? before;
    if (!before || !who || sameStanding(before, who)) return;
    void queryClient.resetQueries({ predicate: (query) => query.queryKey[0] !== queryKey[0] });
  }, [queryClient, who]);
}

/** Learns from a refused call that the session is over, or that the role has changed. */
export function learnFromRefusal(queryClient: QueryClient, error: Error): void {
  const session = queryClient.getQueryData<Session>(queryKey);
  if (session?.state !== 'signed-in') return;
  if (isStatus(error, 401)) {
    noteSession(undefined);
    queryClient.setQueryData(queryKey, withoutSession(session));
  }
  if (isStatus(error, 403)) void queryClient.invalidateQueries({ queryKey });
}

export function useSignIn() {
  const queryClient = useQueryClient();
  return useMutation<AccountAnswer, ProblemError, SignInRequest>({
    mutationKey: ['sign-in'],
    mutationFn: (body) => client.signIn(body),
    onSuccess: (who) => {
      noteSession(who);
      queryClient.setQueryData<Session>(queryKey, signedIn(who));
    },
    // The password goes with the form.
    gcTime: 0,
  });
}

export function useSignOut() {
  return useMutation<void, ProblemError>({
    mutationFn: async () => {
      try {
        await client.signOut();
      } catch (error) {
        // Signed out already, which is what was asked for.
        if (!isStatus(error, 401)) throw error;
      }
    },
    onSuccess: () => {
      noteSession(undefined);
      // A new page: nothing of this person stays in memory.
      window.location.assign('/sign-in');
    },
  });
}

export function useChooseOrganization() {
  const queryClient = useQueryClient();
  return useMutation<AccountAnswer, ProblemError, string>({
    mutationFn: (organizationId) => client.chooseOrganization(organizationId),
    onSuccess: (who) => {
      noteSession(who);
      queryClient.setQueryData<Session>(queryKey, signedIn(who));
    },
  });
}
