import '../curves/no-eval';
import { useLayout } from '../ui/use-layout';
import { MixturePhone } from './mixture-phone';
import { MixtureWide } from './mixture-wide';
import { useMixture } from './use-mixture';

/** Mixture: what will the pH be. */
export function MixtureScreen() {
  const mixture = useMixture();
  const { rail } = useLayout();
  return rail ? <MixtureWide mixture={mixture} /> : <MixturePhone mixture={mixture} />;
}
