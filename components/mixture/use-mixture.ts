import { useState } from 'react';
import { systemTitle } from '../handbook/system-title';
import { useToast } from '../ui/toast';
import { placeFaults } from './faults';
import { useKnownSystems, useMixtureAnswer, useTrialAcid } from './mixture-queries';
import { mixtureAsked } from './mixture-request';
import type { ElectrolytePart, MixtureState, WeighedPart } from './mixture-state';
import { useAddress } from './use-address';

/** Everything the Mixture screen shows and does, whichever way it is laid out. */
export function useMixture() {
  const { state, faulty, change } = useAddress();
  const { systemOf, isMissing, failure } = useKnownSystems(state.parts.map(({ choice }) => choice));
  const asked = mixtureAsked(state, systemOf);
  const call = useMixtureAnswer(asked);
  const trialPH = useTrialAcid(call.answered);
  return {
    state,
    faulty,
    asked,
    systemOf,
    /** No system has the id of a choice. */
    isMissing,
    /** A stored system that could not be read, while nothing can be asked without it. */
    unread: asked ? undefined : failure,
    call,
    answered: call.answered,
    trialPH,
    faults: placeFaults(call.error, asked),
    change,
    flask: useFlask(state, change),
  };
}

export type Mixture = ReturnType<typeof useMixture>;

/** What can be put into the flask and taken out of it. */
function useFlask(state: MixtureState, change: (part: Partial<MixtureState>) => void) {
  const { parts, electrolytes } = state;
  const say = useToast();
  // Rows are known by their place; once one is gone the others must not inherit what it held.
  const [generation, setGeneration] = useState(0);
  const remove = (rest: Partial<MixtureState>, name: string) => {
    setGeneration((before) => before + 1);
    change(rest);
    say({
      text: `${name} taken out of the mixture`,
      undo: () => {
        setGeneration((before) => before + 1);
        change({ parts, electrolytes });
      },
    });
  };
  return {
    generation,
    addPart: (part: WeighedPart) => change({ parts: [...parts, part] }),
    setPart: (index: number, part: WeighedPart) => change({ parts: parts.with(index, part) }),
    removePart: (index: number, name: string) =>
      remove({ parts: parts.filter((_, i) => i !== index) }, systemTitle(name)),
    addElectrolyte: (part: ElectrolytePart) => change({ electrolytes: [...electrolytes, part] }),
    setElectrolyte: (index: number, part: ElectrolytePart) =>
      change({ electrolytes: electrolytes.with(index, part) }),
    removeElectrolyte: (index: number) =>
      remove(
        { electrolytes: electrolytes.filter((_, i) => i !== index) },
        electrolytes[index]?.name ?? '',
      ),
  };
}
