import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { Button } from '../ui/button';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { space, useTheme } from '../ui/theme';
import { Words } from '../ui/words';
import type { DrawnCurve } from './drawn-curve';
import type { Reading } from './follow-curve';
import { rowsAtMost } from './folded';
import { FormRow } from './read-out-row';
import { trueMinus } from './rounded';

interface FormsTableProps {
  readonly drawn: DrawnCurve;
  readonly reading: Reading;
  readonly label?: string;
}

/** A system with more forms than this shows only those worth a row, and the rest when asked. */
const worthARow = 0.001;

/** The forms in order of charge, with their fractions; the greatest is bold and never moved. */
export function FormsTable({ drawn, reading, label = 'Forms at the cursor' }: FormsTableProps) {
  const { colours } = useTheme();
  const [all, setAll] = useState(false);
  const many = drawn.formulas.length > rowsAtMost;
  const rows = reading.fractions
    .map((fraction, index) => ({ fraction, index }))
    .filter(({ fraction }) => !many || all || Number(fraction) >= worthARow);
  return (
    <View>
      <View role="table" aria-label={label}>
        <View role="row" style={[styles.head, { borderBottomColor: colours.edge }]}>
          <View role="columnheader">
            <Words kind="label" tone="inkSoft">
              form
            </Words>
          </View>
          <View role="columnheader">
            <Words kind="label" tone="inkSoft">
              <Quantity of="alpha" /> at pH <Numerals>{trueMinus(reading.pH)}</Numerals>
            </Words>
          </View>
        </View>
        {rows.map(({ fraction, index }) => (
          <FormRow
            key={index}
            index={index}
            formula={drawn.formulas[index] ?? ''}
            fraction={fraction}
            predominant={index === reading.predominant}
          />
        ))}
      </View>
      {many && (
        <View style={styles.more}>
          <Button
            kind="quiet"
            expanded={all}
            label={all ? 'Show the common forms' : `Show all ${drawn.formulas.length} forms`}
            onPress={() => setAll(!all)}
          />
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  head: {
    flexDirection: 'row',
    justifyContent: 'space-between',
    alignItems: 'flex-end',
    minHeight: 29,
    paddingBottom: space[1],
    borderBottomWidth: 1,
  },
  more: { alignItems: 'flex-start' },
});
