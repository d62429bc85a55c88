import { useQueries, useQuery } from '@tanstack/react-query';
import { computeClient, patience, typingRest } from '../answer/compute-client';
import { useSettled } from '../ui/use-settled';
import { capacityOf } from './capacity';
import type { CurveAsked } from './curve-asked';
import type { CurveGrid } from './curve-grid';
import { fetchCurve } from './curve-queries';
import type { DrawnCurve } from './drawn-curve';
import { capacityBody, pointBody } from './layer-bodies';

const capacityQuery = (
  asked: CurveAsked | undefined,
  grid: CurveGrid | undefined,
  total: string,
  enabled: boolean,
) => ({
  queryKey: ['capacity', asked, grid, total],
  enabled: enabled && asked !== undefined && grid !== undefined,
  queryFn: async ({ signal }: { signal: AbortSignal }) => {
    if (!asked || !grid) return null;
    const body = capacityBody(asked, total, grid);
    return capacityOf(await computeClient.publicBufferCapacity(body, { signal }), total);
  },
  ...patience,
});

/** Buffer capacity of what is drawn, over the same grid. */
export function useCapacity(drawn: DrawnCurve | undefined, total: string, enabled: boolean) {
  const settled = useSettled(total, typingRest);
  return useQuery(capacityQuery(drawn?.asked, drawn?.grid, settled, enabled));
}

/** The isoelectric point of what is drawn. */
export function useIsoelectricPoint(drawn: DrawnCurve | undefined, enabled: boolean) {
  return useQuery({
    queryKey: ['isoelectric-point', drawn?.asked],
    enabled: enabled && drawn !== undefined,
    queryFn: async ({ signal }) => {
      if (!drawn) return null;
      const body = pointBody(drawn.asked);
      return (await computeClient.publicIsoelectricPoint(body, { signal })).isoelectricPoint;
    },
    ...patience,
  });
}

interface BesideOptions {
  readonly total: string;
  readonly withCapacity: boolean;
}

/** The curves to compare with, over the grid of the first one. */
export function useBesideCurves(
  beside: readonly CurveAsked[],
  grid: CurveGrid | undefined,
  { total, withCapacity }: BesideOptions,
) {
  const settled = useSettled(beside, typingRest);
  const settledTotal = useSettled(total, typingRest);
  const curves = useQueries({
    queries: settled.map((asked) => ({
      queryKey: ['beside', asked, grid],
      enabled: grid !== undefined,
      queryFn: ({ signal }: { signal: AbortSignal }) => fetchCurve(asked, signal, grid),
      ...patience,
    })),
  });
  const capacities = useQueries({
    queries: settled.map((asked) => capacityQuery(asked, grid, settledTotal, withCapacity)),
  });
  return settled.map((asked, i) => ({
    asked,
    drawn: curves[i]?.data,
    error: curves[i]?.error ?? null,
    refetch: () => curves[i]?.refetch(),
    capacity: capacities[i]?.data ?? undefined,
  }));
}
