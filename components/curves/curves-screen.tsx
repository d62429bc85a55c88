import './no-eval';
import { useLayout } from '../ui/use-layout';
import { CurvesPhone } from './curves-phone';
import { CurvesWide } from './curves-wide';
import { useCurves } from './use-curves';

/** Curves: what forms are present at this pH. */
export function CurvesScreen() {
  const { rail } = useLayout();
  const curves = useCurves({ rail });
  return rail ? <CurvesWide curves={curves} /> : <CurvesPhone curves={curves} />;
}
