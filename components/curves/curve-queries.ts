import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { createClient, ProblemError } from '../../shared/client';
import { curveDigits, gridOf } from './curve-grid';
import { systemAsked, type Choice } from '../constants/choice';
import { givenConstants } from './curves-state';
import { drawnCurve } from './drawn-curve';
import type { DrawnCurve } from './drawn-curve';
import type { Reading } from './follow-curve';
import { exactReading, followCurve } from './follow-curve';
import { useSettled } from '../ui/use-settled';

const client = createClient({ baseUrl: '' });

const retriesAtMost = 3;
const isPassing = ({ problem }: ProblemError) =>
  problem.status === 429 || problem.status === 0 || problem.status >= 500;

/** What passes by itself is tried again, when the service says so where it does. */
const patience = {
  staleTime: Infinity,
  retry: (failures: number, error: Error) =>
    error instanceof ProblemError && isPassing(error) && failures < retriesAtMost,
  retryDelay: (failures: number, error: Error) =>
    1000 * ((error instanceof ProblemError && error.retryAfter) || 2 ** failures),
} as const;

/** A choice while it is typed is asked for once it rests. */
const typingRest = 200;
/** The exact answer is asked for once the cursor rests, ms. */
const cursorRest = 150;

/** The curve of a system; the last one stays until the new one is there, or where it is refused. */
export function useCurve(choice: Choice) {
  const settled = useSettled(choice, choice.kind === 'typed' ? typingRest : 0);
  const query = useQuery({
    queryKey: ['curve', settled],
    queryFn: async ({ signal }) => {
      const pH = gridOf(givenConstants(settled));
      const body = { system: systemAsked(settled), pH, digits: curveDigits };
      return drawnCurve(settled, await client.publicFractions(body, { signal }));
    },
    ...patience,
  });
  const [last, setLast] = useState(query.data);
  if (query.data && query.data !== last) setLast(query.data);
  return {
    ...query,
    drawn: query.data ?? last,
    /** What is drawn is the choice, and not the one before it. */
    isCurrent: query.data !== undefined && settled === choice,
  };
}

/** What is present at a pH: from the curve at once, exactly as soon as the cursor rests. */
export function useReading(drawn: DrawnCurve | undefined, pH: string): Reading | undefined {
  const settled = useSettled(pH, cursorRest);
  const { data } = useQuery({
    queryKey: ['reading', drawn?.choice, settled],
    enabled: drawn !== undefined,
    queryFn: async ({ signal }) => {
      if (!drawn) return null;
      const body = { system: systemAsked(drawn.choice), pH: settled };
      return exactReading(await client.publicFractions(body, { signal })) ?? null;
    },
    ...patience,
  });
  if (!drawn) return undefined;
  return data && settled === pH ? data : followCurve(drawn.answer, pH);
}
