import { createClient, ProblemError } from '../../shared/client';

/** The client of the compute screens: their questions need no key. */
export const computeClient = createClient({ baseUrl: '' });

const retriesAtMost = 3;
/** What may go by itself: no connection, too many calls, a fault or a rest of the service. */
export const isPassing = ({ problem }: ProblemError) =>
  problem.status === 429 || problem.status === 0 || problem.status >= 500;

/** What passes by itself is tried again, when the service says so where it does. */
export const patience = {
  staleTime: Infinity,
  retry: (failures: number, error: Error) =>
    error instanceof ProblemError && isPassing(error) && failures < retriesAtMost,
  retryDelay: (failures: number, error: Error) =>
    1000 * ((error instanceof ProblemError && error.retryAfter) || 2 ** failures),
} as const;

/** What is typed is asked for once it rests, ms. */
export const typingRest = 200;
