import { StyleSheet, View } from 'react-native';
import { modelInShort } from '../conditions/activity-models';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { space, useTheme } from '../ui/theme';
import { Words } from '../ui/words';
import type { DrawnCurve } from './drawn-curve';
import { Ruled } from './read-out-row';
import { shownConstant, trueMinus } from './rounded';

/** Constants as given, and what they are under the conditions of the curve. */
export function MovedConstants({ drawn }: { readonly drawn: DrawnCurve }) {
  const { colours } = useTheme();
  const { answer, system, constants } = drawn;
  const { temperature, ionicStrength, activityModel } = answer.model.conditions;
  const isThermodynamic = constants.every(({ kind }) => kind === 'thermodynamic');
  return (
    <View style={styles.list}>
      <View role="table" aria-label="Constants as given and under these conditions">
        <View role="row" style={[styles.row, styles.head, { borderBottomColor: colours.edge }]}>
          <View role="columnheader" style={styles.name}>
            <Words kind="help">constants</Words>
          </View>
          <View role="columnheader">
            <Words kind="help">
              {isThermodynamic ? (
                <>
                  <Quantity of="pKStandard" /> at 0
                </>
              ) : (
                'as given'
              )}
            </Words>
          </View>
          <View role="columnheader" style={styles.value}>
            <Words kind="help">
              <Quantity of="pKPrime" /> at <Quantity of="ionicStrength" />
            </Words>
          </View>
        </View>
        {system.pKa.map((given, i) => (
          <Ruled key={i}>
            <View role="rowheader" style={styles.name}>
              <Words>
                <Quantity of="pK" index={i + 1} />
              </Words>
            </View>
            <View role="cell">
              <Numerals tone="inkSoft">{shownConstant(given)}</Numerals>
            </View>
            <View role="cell" style={styles.value}>
              <Numerals bold>{Number(answer.effectivePKa[i]).toFixed(3)}</Numerals>
            </View>
          </Ruled>
        ))}
      </View>
      <Words kind="help">
        <Quantity of="pKPrime" /> at <Numerals>{temperature}</Numerals> °C and{' '}
        <Quantity of="ionicStrength" /> = <Numerals>{trueMinus(ionicStrength)}</Numerals> mol/L,{' '}
        {modelInShort(activityModel)}: what the curve uses, on the pH scale.
      </Words>
    </View>
  );
}

const styles = StyleSheet.create({
  list: { gap: space[2] },
  row: { flexDirection: 'row', gap: space[2], justifyContent: 'space-between' },
  head: { minHeight: 29, alignItems: 'flex-end', paddingBottom: space[1], borderBottomWidth: 1 },
  name: { flex: 1 },
  value: { minWidth: 76, alignItems: 'flex-end' },
});
