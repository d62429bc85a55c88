import '../curves/no-eval';
import { FaultyFields } from '../conditions/faulty-fields';
import { useLayout } from '../ui/use-layout';
import { MixturePhone } from './mixture-phone';
import { MixtureWide } from './mixture-wide';
import { useMixture } from './use-mixture';

/** Mixture: what will the pH be. */
export function MixtureScreen() {
  const mixture = useMixture();
  const { rail } = useLayout();
  return (
    <FaultyFields>
      {rail ? <MixtureWide mixture={mixture} /> : <MixturePhone mixture={mixture} />}
    </FaultyFields>
  );
}
