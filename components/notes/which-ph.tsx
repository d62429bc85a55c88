import { Section } from '../shell/prose';
import { Formula } from '../ui/formula';
import { Quantity } from '../ui/quantity';
import { Words } from '../ui/words';

/** Activity or concentration: the question behind every pH. */
export function WhichPH() {
  return (
    <Section heading="Which pH">
      <Words>
        pH here is −lg <Quantity of="activity" />(<Formula formula="H^+" />
        ), the activity that a calibrated glass electrode reads, never −lg{' '}
        <Quantity of="concentration" />(
        <Formula formula="H^+" />
        ). The two agree only where the ionic strength is 0.
      </Words>
    </Section>
  );
}
