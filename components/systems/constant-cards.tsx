import { StyleSheet, View } from 'react-native';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { space, useTheme } from '../ui/theme';
import { Words } from '../ui/words';
import { ConstantFlags } from './constant-flags';
import type { ConstantsProps } from './constants-table';
import { KnownBeside } from './known-beside';
import { StepFormulas } from './step-formulas';

/** Constants on a phone: one a row, what was determined with it under it. */
export function ConstantCards({ caption, constants, species }: ConstantsProps) {
  const { colours } = useTheme();
  return (
    <View role="list" aria-label={caption}>
      {constants.map((constant) => (
        <View
          key={constant.step}
          role="listitem"
          style={[styles.card, { borderTopColor: colours.rule }]}
        >
          <View style={styles.line}>
            <View style={styles.forms}>
              <StepFormulas step={constant.step} species={species} />
            </View>
            <Words>
              <Quantity of="pKa" index={constant.step} />
              {' = '}
              <Numerals bold>{constant.value}</Numerals>
            </Words>
          </View>
          <ConstantFlags {...constant} />
          <KnownBeside constant={constant} />
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  card: { borderTopWidth: 1, paddingVertical: space[3], gap: space[1] },
  line: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'space-between', gap: space[2] },
  forms: { flexShrink: 1 },
});
