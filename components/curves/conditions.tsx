import type { ReactNode } from 'react';
import { TSpan } from 'react-native-svg';
import { ionicStrengthSign } from '../chart/symbols';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import type { Choice } from './curves-state';
import { exampleOf } from './curves-state';
import { fonts } from '../ui/theme';

/**
 * What the curve holds for. The model is ideal; constants measured in a medium are drawn as given
 * and hold in that medium.
 */
export function conditionsOf(choice: Choice) {
  const ionicStrength = exampleOf(choice)?.ionicStrength ?? '0';
  return { temperature: '25', ionicStrength, model: ionicStrength === '0' ? 'ideal' : 'as given' };
}

/** The conditions as plain text, for files. */
export const conditionsText = (choice: Choice) => {
  const { temperature, ionicStrength, model } = conditionsOf(choice);
  return `${temperature} °C · I = ${ionicStrength} · ${model}`;
};

/** The conditions inside a drawing. */
export const conditionsInFigure = (choice: Choice): ReactNode => {
  const { temperature, ionicStrength, model } = conditionsOf(choice);
  return (
    <TSpan fontFamily={fonts.numbers}>
      {`${temperature} °C · `}
      {ionicStrengthSign}
      {` = ${ionicStrength} · ${model}`}
    </TSpan>
  );
};

/** The conditions as a line of text. */
export function Conditions({ choice }: { readonly choice: Choice }) {
  const { temperature, ionicStrength, model } = conditionsOf(choice);
  return (
    <Numerals>
      {`${temperature} °C · `}
      <Quantity of="ionicStrength" />
      {` = ${ionicStrength} · ${model}`}
    </Numerals>
  );
}
