import { firstState, type Layer } from '../curves/curves-state';
import { LiveFigure } from '../curves/live-figure';

interface SignInFigureProps {
  readonly layers: readonly Layer[];
  readonly height: number;
  readonly compact: boolean;
}

/** The public curve, alive: what the work is about, before anybody signs in. */
export const SignInFigure = (props: SignInFigureProps) => (
  <LiveFigure choice={firstState.choice} {...props} />
);
