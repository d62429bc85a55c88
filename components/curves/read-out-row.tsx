import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Swatch } from '../chart/swatch';
import { Formula } from '../ui/formula';
import { Numerals } from '../ui/numerals';
import { space, useTheme } from '../ui/theme';
import { Words } from '../ui/words';
import { shownFraction } from './rounded';

interface FormRowProps {
  readonly index: number;
  readonly formula: string;
  readonly fraction: string;
  readonly predominant: boolean;
}

/** One form at the cursor: its line, its formula, how much of it there is. */
export function FormRow({ index, formula, fraction, predominant }: FormRowProps) {
  const { series } = useTheme();
  return (
    <Ruled>
      <View role="cell" style={styles.form}>
        <Swatch style={series(index)} strong={predominant} />
        <Formula formula={formula} bold={predominant} />
        {predominant && (
          <View style={styles.note}>
            <Words kind="help" tone="ink">
              predominant
            </Words>
          </View>
        )}
      </View>
      <View role="cell">
        <Numerals bold={predominant}>{shownFraction(fraction)}</Numerals>
      </View>
    </Ruled>
  );
}

interface ValueRowProps {
  readonly label: ReactNode;
  readonly value: string;
}

/** One figure with its name. */
export function ValueRow({ label, value }: ValueRowProps) {
  return (
    <Ruled>
      <View role="cell" style={styles.form}>
        {label}
      </View>
      <View role="cell">
        <Numerals>{value}</Numerals>
      </View>
    </Ruled>
  );
}

/** A row over a hairline. */
export function Ruled({ children }: { readonly children: ReactNode }) {
  const { colours } = useTheme();
  return (
    <View role="row" style={[styles.row, { borderBottomColor: colours.rule }]}>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: space[2],
    minHeight: 34,
    borderBottomWidth: 1,
  },
  form: { flexDirection: 'row', alignItems: 'center', gap: space[3], flexShrink: 1 },
  note: { marginLeft: 'auto' },
});
