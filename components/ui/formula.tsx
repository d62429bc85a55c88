import { Text } from 'react-native';
import { parseFormula, spokenFormula } from './formula-parts';
import { Numerals, type NumeralsSize } from './numerals';
import { Raised } from './raised';
import type { Colours } from './theme';

interface FormulaProps {
  /** Plain notation, charge after `^`: `H2PO4^-`, `H6Y^2+`, `CH3COOH`. */
  readonly formula: string;
  readonly bold?: boolean;
  readonly size?: NumeralsSize;
  readonly tone?: keyof Colours;
}

/** A chemical formula with its indices and charge in place. */
export function Formula({ formula, bold, size, tone }: FormulaProps) {
  return (
    <Numerals bold={bold} size={size} tone={tone}>
      <Text role="img" aria-label={spokenFormula(formula)}>
        {parseFormula(formula).map(({ text, place }, index) =>
          place === 'base' ? (
            text
          ) : (
            <Raised key={index} place={place}>
              {text}
            </Raised>
          ),
        )}
      </Text>
    </Numerals>
  );
}
