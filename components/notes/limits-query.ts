import { useQuery } from '@tanstack/react-query';
import { createClient, type ProblemError } from '../../shared/client';
import type { LimitsAnswer } from '../../shared/limits-answer';

const client = createClient({ baseUrl: '' });

/** The limits that the service has in force. */
export const useLimits = () =>
  useQuery<LimitsAnswer, ProblemError>({
    queryKey: ['limits'],
    queryFn: ({ signal }) => client.limits({ signal }),
  });
