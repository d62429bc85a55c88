import { Section } from '../shell/prose';
import { Formula } from '../ui/formula';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { Words } from '../ui/words';

/** What the models are, and what their numbers are worth. */
export function ModelNotes() {
  return (
    <Section heading="The model">
      <Words>
        Curves begin with the ideal solution at ionic strength <Quantity of="ionicStrength" />
        &nbsp;=&nbsp;<Numerals>0</Numerals>: constants are used as they stand, as if the water held
        nothing else. Salt shifts them. Phosphate’s second constant, <Numerals>7.198</Numerals> at{' '}
        <Quantity of="ionicStrength" />
        &nbsp;=&nbsp;<Numerals>0</Numerals>, acts like <Numerals>6.88</Numerals> in{' '}
        <Numerals>0.1</Numerals>&nbsp;mol/L salt (Davies, <Numerals>25</Numerals>&nbsp;°C): at
        pH&nbsp;<Numerals>7.40</Numerals> the ratio of its two forms doubles. Set temperature, ionic
        strength and a model, and thermodynamic constants are moved there.
      </Words>
      <Words>
        Mixture takes Davies’s equation at the ionic strength of the mixture itself. Each model has
        a range: the limiting law to <Numerals>0.005</Numerals>, Güntelberg’s and the extended
        equation to <Numerals>0.1</Numerals>, Davies’s to <Numerals>0.5</Numerals>, specific ion
        interaction to about <Numerals>1</Numerals>&nbsp;mol/L. Beyond it the answer warns, beyond
        twice it is refused unless you ask for it all the same.
      </Words>
      <Words>
        Against the conventional pH of reference buffers, with nothing fitted, Davies’s equation
        stays within <Numerals>0.02</Numerals> at <Numerals>25</Numerals>&nbsp;°C and within{' '}
        <Numerals>0.03</Numerals> from <Numerals>0</Numerals> to <Numerals>50</Numerals>&nbsp;°C. In
        physiological salt the models differ by <Numerals>0.05</Numerals> and no primary value
        exists.
      </Words>
      <Words>
        Constants measured in a medium of their own belong to it: mixed ones take the pH meter as
        the measure of <Quantity of="activity" />
        (<Formula formula="H^+" />
        ), concentration constants stand about <Numerals>0.1</Numerals> away from them at{' '}
        <Numerals>0.1</Numerals>&nbsp;mol/L. At another ionic strength or temperature they are
        refused rather than bent.
      </Words>
      <Words>
        A form predominates where its fraction is the largest. When one constant is smaller than the
        one before it, the form between the two never predominates: it is computed, and has no step
        of its own.
      </Words>
    </Section>
  );
}
