import { useMemo, useState } from 'react';
import { ProblemError } from '../../shared/client';
import type { Choice } from '../constants/choice';
import { plainSystem } from '../constants/choice';
import { systemTitle } from '../handbook/system-title';
import { givenConstants } from './curve-asked';
import { changedConditions, type CurveConditions } from './curve-conditions';
import { rangeOf } from './curve-grid';
import { useCurve, useReading } from './curve-queries';
import { firstState, layersOfView } from './curves-state';
import type { DrawnCurve } from './drawn-curve';
import { pHWithin } from './ph-steps';
import { useAddress } from './use-address';
import { useExtras } from './use-extras';
import { useConstantsDraft } from '../constants/use-constants-draft';

/** Everything the Curves screen shows and does, whichever way it is laid out. */
export function useCurves({ rail }: { readonly rail: boolean }) {
  const { state, faulty, change } = useAddress();
  const { choice, conditions } = state;
  const asked = useMemo(() => ({ choice, conditions }), [choice, conditions]);
  const [unknown, setUnknown] = useState<string>();
  const draw = (next: Choice) =>
    change({ choice: next, pH: pHWithin(state.pH, rangeOf(givenConstants(next))) });
  const choose = (next: Choice) => {
    setUnknown(undefined);
    draw(next);
  };
  const editing = useConstantsDraft(choice, choose);
  const curve = useCurve(asked);
  const { drawn } = curve;

  if (choice.kind === 'stored' && isUnknown(curve.error) && choice.id !== firstState.choice.id) {
    setUnknown(choice.id);
    draw(firstState.choice);
  }

  // An old curve that is still shown may not reach as far as the cursor of the new one.
  const pH = drawn ? pHWithin(state.pH, drawn.range) : state.pH;
  const reading = useReading(drawn, pH);

  const shown = rail ? state.layers : layersOfView[state.view];
  const layers = useExtras(state, drawn, shown);

  return {
    state,
    /** The layers that the figure shows. */
    shown,
    ...layers,
    faulty,
    /** Id that the address asked for and that no system has. */
    unknown,
    title: titleOf(choice, drawn),
    drawn,
    reading,
    curve,
    editing,
    choose,
    change,
    /** Changes a part of the conditions. */
    setConditions: (part: Partial<CurveConditions>) =>
      change({ conditions: changedConditions(conditions, part) }),
    move: (next: string) => change({ pH: next }),
    /** Begins a system of one's own from the one that is drawn. */
    typeOwn: () => {
      if (choice.kind === 'stored') choose({ kind: 'typed', system: drawn?.system ?? plainSystem });
    },
  };
}

const isUnknown = (error: Error | null) =>
  error instanceof ProblemError &&
  error.problem.errors?.some(({ code }) => code === 'unknown-system');

/** A stored system's name comes with its curve; until then the one that is drawn stands there. */
function titleOf(choice: Choice, drawn: DrawnCurve | undefined): string {
  if (choice.kind === 'typed') return choice.system.name ?? 'Your constants';
  return drawn ? systemTitle(drawn.system.name ?? 'Your constants') : 'Curves';
}

export type Curves = ReturnType<typeof useCurves>;
