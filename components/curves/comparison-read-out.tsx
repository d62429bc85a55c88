import { View } from 'react-native';
import { Warnings } from '../answer/warnings';
import { Formula } from '../ui/formula';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { BesideName } from './beside-name';
import { haveSameForms, shiftOf } from './comparison';
import type { DrawnCurve } from './drawn-curve';
import type { BesideCurve } from './figure-extras';
import { followCurve } from './follow-curve';
import { FormsTable } from './forms-table';
import { ValueRow } from './read-out-row';
import { signedChange } from './rounded';

interface ComparisonReadOutProps {
  readonly drawn: DrawnCurve;
  readonly beside: readonly BesideCurve[];
  readonly pH: string;
}

/** How far the curves beside have moved; of other systems, what is present at the cursor. */
export function ComparisonReadOut({ drawn, beside, pH }: ComparisonReadOutProps) {
  return beside.map((curve, place) => {
    const { drawn: other, name } = curve;
    const reading = followCurve(other.answer, pH);
    return (
      <View key={place} style={{ gap: space[2] }}>
        <Words kind="section" heading={2}>
          Compared with <BesideName name={name} />
        </Words>
        <Warnings warnings={warningsBeside(drawn, other)} />
        {haveSameForms(drawn, other) ? (
          <Moves drawn={drawn} beside={other} name={name} />
        ) : (
          reading && (
            <FormsTable drawn={other} reading={reading} label={`Forms of ${name} at the cursor`} />
          )
        )}
      </View>
    );
  });
}

/** What to know of the curve beside that is not already said of the first. */
const warningsBeside = (drawn: DrawnCurve, other: DrawnCurve) => {
  const said = new Set(drawn.answer.model.warnings.map(({ message }) => message));
  return other.answer.model.warnings.filter(({ message }) => !said.has(message));
};

interface MovesProps {
  readonly drawn: DrawnCurve;
  readonly beside: DrawnCurve;
  readonly name: string;
}

function Moves({ drawn, beside, name }: MovesProps) {
  const { constants, largest } = shiftOf(drawn, beside);
  return (
    <View role="table" aria-label={`How far ${name} moves the curves`}>
      {constants.map((shift, i) => (
        <ValueRow
          key={i}
          label={
            <Words>
              Δ
              <Quantity of="pKPrime" index={i + 1} />
            </Words>
          }
          value={shift}
        />
      ))}
      <ValueRow
        label={
          <Words>
            <Formula formula={drawn.formulas[largest.index] ?? ''} /> most, at pH{' '}
            <Numerals>{largest.pH.toFixed(2)}</Numerals>
          </Words>
        }
        value={signedChange(largest.change)}
      />
    </View>
  );
}
