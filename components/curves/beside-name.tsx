import { TSpan } from 'react-native-svg';
import { Quantity } from '../ui/quantity';
import { fonts } from '../ui/theme';

/** Parts of a name such as `I 0.15 · 37 °C` around the sign of ionic strength. */
const partsOf = (name: string) => name.split(/\bI (?=\d)/);

/** What sets a curve beside apart, as text. */
export function BesideName({ name }: { readonly name: string }) {
  const [before, after] = partsOf(name);
  if (after === undefined) return name;
  return (
    <>
      {before}
      <Quantity of="ionicStrength" /> {after}
    </>
  );
}

/** The same inside a drawing. */
export function besideNameInFigure(name: string) {
  const [before, after] = partsOf(name);
  if (after === undefined) return name;
  return (
    <>
      {before}
      <TSpan fontFamily={fonts.numbers} fontStyle="italic">
        I
      </TSpan>
      {` ${after}`}
    </>
  );
}
