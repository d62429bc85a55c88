import type { ReactNode } from 'react';
import { TSpan } from 'react-native-svg';
import { ionicStrengthSign } from '../chart/symbols';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { fonts } from '../ui/theme';
import { afterI, conditionsOf } from './conditions-of';
import type { DrawnCurve } from './drawn-curve';

/** The conditions inside a drawing. */
export const conditionsInFigure = (drawn: DrawnCurve): ReactNode => {
  const { temperature, ionicStrength, model } = conditionsOf(drawn);
  return (
    <TSpan fontFamily={fonts.numbers}>
      {`${temperature} °C · `}
      {ionicStrengthSign}
      {` ${afterI(ionicStrength)} · ${model}`}
    </TSpan>
  );
};

/** The conditions as a line of text. */
export function Conditions({ drawn }: { readonly drawn: DrawnCurve }) {
  const { temperature, ionicStrength, model } = conditionsOf(drawn);
  return (
    <Numerals>
      {`${temperature} °C · `}
      <Quantity of="ionicStrength" />
      {` ${afterI(ionicStrength)} · ${model}`}
    </Numerals>
  );
}
