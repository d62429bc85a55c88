import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { computeClient, patience, typingRest } from '../answer/compute-client';
import { systemAsked, type Choice } from '../constants/choice';
import { useSettled } from '../ui/use-settled';
import { givenConstants, type CurveAsked } from './curve-asked';
import { conditionsAsked, firstConditions } from './curve-conditions';
import { gridOf, type CurveGrid } from './curve-grid';
import { curveBody } from './curve-request';
import { drawnCurve } from './drawn-curve';
import type { DrawnCurve } from './drawn-curve';
import type { Reading } from './follow-curve';
import { exactReading, followCurve } from './follow-curve';

/** The exact answer is asked for once the cursor rests, ms. */
const cursorRest = 150;

/** One curve over a grid; a stored system's own range comes with its constants. */
export async function fetchCurve(
  asked: CurveAsked,
  signal: AbortSignal,
  grid?: CurveGrid,
): Promise<DrawnCurve> {
  const over = async (pH: CurveGrid) =>
    drawnCurve(asked, await computeClient.publicFractions(curveBody(asked, pH), { signal }), pH);
  if (grid) return over(grid);
  const first = gridOf(givenConstants(asked.choice));
  const drawn = await over(first);
  const own = gridOf(drawn.system.pKa);
  const reaches = own.from === first.from && own.to === first.to;
  return reaches ? drawn : over(own);
}

const isSame = (a: Choice, b: Choice) => a === b || JSON.stringify(a) === JSON.stringify(b);

const isTyped = ({ choice, conditions }: CurveAsked) =>
  choice.kind === 'typed' || conditions !== firstConditions;

/**
 * The curve that is asked for; the last one stays until the new one is there, or where it is
 * refused. `asked` is the same object as long as the question is the same.
 */
export function useCurve(asked: CurveAsked) {
  const settled = useSettled(asked, isTyped(asked) ? typingRest : 0);
  const query = useQuery({
    queryKey: ['curve', settled],
    queryFn: ({ signal }) => fetchCurve(settled, signal),
    ...patience,
  });
  const [last, setLast] = useState(query.data);
  if (query.data && query.data !== last) setLast(query.data);
  const drawn = query.data ?? last;
  return {
    ...query,
    drawn,
    /** What is drawn is of the system that is asked for, under whichever conditions. */
    isOfChoice: drawn !== undefined && isSame(drawn.asked.choice, asked.choice),
    /** What is drawn is what is asked for, and not what was before. */
    isCurrent: query.data !== undefined && settled === asked,
  };
}

/** What is present at a pH: from the curve at once, exactly as soon as the cursor rests. */
export function useReading(drawn: DrawnCurve | undefined, pH: string): Reading | undefined {
  const settled = useSettled(pH, cursorRest);
  const { data } = useQuery({
    queryKey: ['reading', drawn?.asked, settled],
    enabled: drawn !== undefined,
    queryFn: async ({ signal }) => {
      if (!drawn) return null;
      const { choice, conditions } = drawn.asked;
      const body = { system: systemAsked(choice), pH: settled, ...conditionsAsked(conditions) };
      return exactReading(await computeClient.publicFractions(body, { signal })) ?? null;
    },
    ...patience,
  });
  if (!drawn) return undefined;
  return data && settled === pH ? data : followCurve(drawn.answer, pH);
}
