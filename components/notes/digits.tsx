import { limits } from '../../shared/limits';
import { Section } from '../shell/prose';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { Words } from '../ui/words';

/** How far the digits can be trusted, and how far the constants can. */
export function Digits() {
  const { from, to } = limits.digits;
  return (
    <Section heading="The digits">
      <Words>
        The API answers with <Numerals>{from}</Numerals> to <Numerals>{to}</Numerals> digits, and
        every one is right: the model’s exact value for the constants as you typed them, rounded
        half to even. That says nothing about the constants themselves.
      </Words>
      <Words>
        A constant known to ±<Numerals>0.01</Numerals> leaves a ratio of neighbouring forms
        uncertain by <Numerals>2.3</Numerals>&nbsp;%, one known to ±<Numerals>0.05</Numerals> by{' '}
        <Numerals>12</Numerals>&nbsp;%. So the screen shows three digits or so of a fraction{' '}
        <Quantity of="alpha" />, and copying gives them all.
      </Words>
    </Section>
  );
}
