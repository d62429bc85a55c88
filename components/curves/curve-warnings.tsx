import { Warnings } from '../answer/warnings';
import type { Curves } from './use-curves';

/** What to know about the curve that is drawn, in the answer's words. */
export function CurveWarnings({ drawn, curve }: Pick<Curves, 'drawn' | 'curve'>) {
  return <Warnings warnings={curve.isOfChoice && drawn ? drawn.answer.model.warnings : []} />;
}
