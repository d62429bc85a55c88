import { TSpan } from 'react-native-svg';
import { Exact } from '../../shared/decimal';
import { ionicStrengthSign } from '../chart/symbols';
import { modelInShort } from '../conditions/activity-models';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { fonts } from '../ui/theme';
import type { Answered } from './mixture-queries';

const digits = 3;

/** What an answer holds for, in the parts before and after the sign of ionic strength. */
function conditionsOf({ answer }: Answered): readonly [string, string] {
  const { temperature, activityModel, ionicStrength } = answer.model.conditions;
  const used = new Exact(answer.ionicStrengthUsed).toSignificantDigits(digits).toFixed();
  const own = ionicStrength === 'self-consistent' ? ' from all ions' : '';
  const isIdeal = activityModel === 'ideal';
  return [
    `${temperature} °C · `,
    ` = ${used} mol/L${isIdeal ? '' : own} · ${modelInShort(activityModel)}`,
  ];
}

/** The conditions as plain text, for files. */
export const conditionsText = (answered: Answered) => conditionsOf(answered).join('I');

/** The conditions as a line of text. */
export function ConditionsLine({ answered }: { readonly answered: Answered }) {
  const [before, after] = conditionsOf(answered);
  return (
    <Numerals size={12} tone="inkSoft">
      {before}
      <Quantity of="ionicStrength" />
      {after}
    </Numerals>
  );
}

/** The conditions inside a drawing. */
export function conditionsInFigure(answered: Answered) {
  const [before, after] = conditionsOf(answered);
  return (
    <TSpan fontFamily={fonts.numbers}>
      {before}
      {ionicStrengthSign}
      {after}
    </TSpan>
  );
}
