import { MutationCache, QueryCache, QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { Slot } from 'expo-router';
import { StatusBar } from 'expo-status-bar';
import { ProblemError } from '../../shared/client';
import { learnFromRefusal, useSessionKeeper } from '../account/session-queries';

/** A refusal stays a refusal: only a service that cannot answer now is asked again. */
const worthAsking = (error: Error) =>
  !(error instanceof ProblemError) || error.problem.status === 0 || error.problem.status === 503;

function newQueryClient(): QueryClient {
  const onError = (error: Error): void => learnFromRefusal(client, error);
  const client: QueryClient = new QueryClient({
    queryCache: new QueryCache({ onError }),
    mutationCache: new MutationCache({ onError }),
    defaultOptions: {
      // A change that cannot be made now is refused now: it must not happen by itself later.
      mutations: { networkMode: 'always' },
      queries: {
        retry: (failures, error) => failures < 2 && worthAsking(error),
        refetchOnWindowFocus: false,
      },
    },
  });
  return client;
}

/** One for the page, not for each Root: the router makes a new one on some steps back. */
const queryClient = newQueryClient();

/** What every route stands in. */
export function Root() {
  return (
    <QueryClientProvider client={queryClient}>
      <SessionKeeper />
      <StatusBar style="auto" />
      <Slot />
    </QueryClientProvider>
  );
}

function SessionKeeper() {
  useSessionKeeper();
  return null;
}
