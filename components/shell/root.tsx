import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { Slot } from 'expo-router';
import { StatusBar } from 'expo-status-bar';
import { useState } from 'react';
import { ProblemError } from '../../shared/client';

/** A refusal stays a refusal: only a service that cannot answer now is asked again. */
const worthAsking = (error: Error) =>
  !(error instanceof ProblemError) || error.problem.status === 0 || error.problem.status === 503;

const newQueryClient = () =>
  new QueryClient({
    defaultOptions: {
      queries: {
        retry: (failures, error) => failures < 2 && worthAsking(error),
        refetchOnWindowFocus: false,
      },
    },
  });

/** What every route stands in. */
export function Root() {
  const [queryClient] = useState(newQueryClient);
  return (
    <QueryClientProvider client={queryClient}>
      <StatusBar style="auto" />
      <Slot />
    </QueryClientProvider>
  );
}
