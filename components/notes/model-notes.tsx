import { Section } from '../shell/prose';
import { Formula } from '../ui/formula';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { Words } from '../ui/words';

/** What the ideal model at I = 0 leaves out, in numbers. */
export function ModelNotes() {
  return (
    <Section heading="The model">
      <Words>
        This version computes the ideal solution at ionic strength <Quantity of="ionicStrength" />
        &nbsp;=&nbsp;<Numerals>0</Numerals>: your constants are used as they stand, as if the water
        held nothing else. Salt shifts them. Phosphate’s second constant, <Numerals>7.198</Numerals>{' '}
        at <Quantity of="ionicStrength" />
        &nbsp;=&nbsp;<Numerals>0</Numerals>, acts like <Numerals>6.88</Numerals> in{' '}
        <Numerals>0.1</Numerals>&nbsp;mol/L salt (Davies, <Numerals>25</Numerals>&nbsp;°C): at
        pH&nbsp;<Numerals>7.40</Numerals> the ratio of its two forms doubles.
      </Words>
      <Words>
        Constants measured in your own medium, with the pH meter as the measure of{' '}
        <Quantity of="activity" />
        (<Formula formula="H^+" />
        ), give curves for that medium: type those. Constants given in concentrations alone stand
        about <Numerals>0.1</Numerals> away from them at <Numerals>0.1</Numerals>&nbsp;mol/L.
        Temperature enters only through the constants you type.
      </Words>
      <Words>
        A form predominates where its fraction is the largest. When one constant is smaller than the
        one before it, the form between the two never predominates: it is computed, and has no step
        of its own.
      </Words>
    </Section>
  );
}
