import './no-eval';
import { useMemo, useState } from 'react';
import type { Choice } from '../constants/choice';
import { firstConditions } from './curve-conditions';
import { useCurve, useReading } from './curve-queries';
import { firstState, type Layer } from './curves-state';
import { MeasuredFigure } from './measured-figure';
import { pHWithin } from './ph-steps';

interface LiveFigureProps {
  /** The same object as long as the system is the same. */
  readonly choice: Choice;
  readonly layers: readonly Layer[];
  readonly height: number;
  readonly compact: boolean;
}

/** A curve outside Curves, alive: its cursor moves, and starts where Curves starts. */
export function LiveFigure({ choice, ...figure }: LiveFigureProps) {
  const [pH, setPH] = useState(firstState.pH);
  const asked = useMemo(() => ({ choice, conditions: firstConditions }), [choice]);
  const { drawn, isFetching } = useCurve(asked);
  const reading = useReading(drawn, drawn ? pHWithin(pH, drawn.range) : pH);
  return (
    <MeasuredFigure
      {...figure}
      drawn={drawn}
      reading={reading}
      isFetching={isFetching}
      onMove={setPH}
    />
  );
}
