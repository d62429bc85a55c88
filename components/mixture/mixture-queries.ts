import { useQueries, useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { MixtureAnswer } from '../../shared/mixtures';
import { computeClient, patience, typingRest } from '../answer/compute-client';
import type { Choice } from '../constants/choice';
import { systemQuery } from '../handbook/handbook-queries';
import { useSettled } from '../ui/use-settled';
import { storedSystem, typedSystem, type KnownSystem } from './known-system';
import { withTrialAcid, type MixtureAsked, type SystemOf } from './mixture-request';

/** An answer with the call that it is of: they stay together while a new one is on its way. */
export interface Answered {
  readonly asked: MixtureAsked;
  readonly answer: MixtureAnswer;
}

/** The stored systems in the flask, read from the handbook; `systemOf` is undefined until then. */
export function useKnownSystems(choices: readonly Choice[]) {
  const ids = [...new Set(choices.flatMap((one) => (one.kind === 'stored' ? one.id : [])))];
  // Whichever revision is computed with, its forms are those of the substance.
  const results = useQueries({ queries: ids.map((id) => systemQuery(id.replace(/@.*/, ''))) });
  const known = new Map<string, KnownSystem>();
  ids.forEach((id, i) => {
    const data = results[i]?.data;
    if (data) known.set(id, storedSystem(data));
  });
  const systemOf: SystemOf = (choice) =>
    choice.kind === 'typed' ? typedSystem(choice) : known.get(choice.id);
  const failure = results.find(({ error }) => error)?.error ?? undefined;
  const isMissing = (choice: Choice) =>
    choice.kind === 'stored' && results[ids.indexOf(choice.id)]?.error?.problem.status === 404;
  return { systemOf, isMissing, failure };
}

/** The last value that was there. */
function useLast<Value>(value: Value | undefined): Value | undefined {
  const [last, setLast] = useState(value);
  if (value !== undefined && value !== last) setLast(value);
  return value ?? last;
}

/** The answer; the last one stays until the new one is there, or where it is refused. */
export function useMixtureAnswer(asked: MixtureAsked | undefined) {
  const wanted = asked && JSON.stringify(asked);
  const settled = useSettled(wanted, typingRest);
  const query = useQuery({
    queryKey: ['mixture', settled],
    enabled: settled !== undefined,
    queryFn: async ({ signal }): Promise<Answered> => {
      const call = JSON.parse(settled ?? '') as MixtureAsked;
      return { asked: call, answer: await computeClient.publicMixture(call.body, { signal }) };
    },
    ...patience,
  });
  return {
    ...query,
    answered: useLast(query.data),
  };
}

/** pH of the same flask with a little strong acid in it; undefined until it is known. */
export function useTrialAcid(answered: Answered | undefined): string | undefined {
  const body = answered && withTrialAcid(answered.asked.body);
  const { data } = useQuery({
    queryKey: ['mixture trial', body],
    enabled: body !== undefined,
    queryFn: async ({ signal }) => {
      if (!body) throw new Error('There is nothing to try.');
      return (await computeClient.publicMixture(body, { signal })).pH;
    },
    ...patience,
  });
  return data;
}
