import { useCurve, useReading } from './curve-queries';
import type { Choice } from './curves-state';
import { exampleOf, systemOf } from './curves-state';
import { rangeOf } from './curve-grid';
import { pHWithin } from './ph-steps';
import { useAddress } from './use-address';
import { useConstantsDraft } from './use-constants-draft';

/** Everything the Curves screen shows and does, whichever way it is laid out. */
export function useCurves() {
  const { state, faulty, change } = useAddress();
  const { choice } = state;
  const choose = (next: Choice) =>
    change({ choice: next, pH: pHWithin(state.pH, rangeOf(systemOf(next).pKa)) });
  const editing = useConstantsDraft(choice, choose);
  const curve = useCurve(choice);
  const { drawn } = curve;
  // An old curve that is still shown may not reach as far as the cursor of the new one.
  const pH = drawn ? pHWithin(state.pH, drawn.range) : state.pH;
  const reading = useReading(drawn, pH);
  return {
    state,
    faulty,
    title: exampleOf(choice)?.title ?? systemOf(choice).name ?? 'Your constants',
    drawn,
    reading,
    curve,
    editing,
    choose,
    change,
    move: (next: string) => change({ pH: next }),
    /** Begins a system of one's own from the one that is drawn. */
    typeOwn: () => choose({ kind: 'typed', system: systemOf(choice) }),
  };
}

export type Curves = ReturnType<typeof useCurves>;
