import { StyleSheet, View } from 'react-native';
import { Numerals } from '../ui/numerals';
import { space, useTheme } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { webStyle } from '../ui/web-style';
import { Words } from '../ui/words';
import { keyParts } from './key-parts';

/** A new key with its four parts named: in a line where there is room, else one under the other. */
export function KeySlip({ value }: { readonly value: string }) {
  const { colours } = useTheme();
  const { rail } = useLayout();
  return (
    <View style={[styles.slip, rail && styles.line]}>
      {keyParts(value).map(({ text, name, use, isSecret }) => {
        const tone = isSecret ? 'clay' : 'ink';
        return (
          <View key={name} style={styles.part}>
            <View
              style={[styles.text, { borderBottomColor: isSecret ? colours.clay : colours.edge }]}
            >
              <Numerals size={18} bold={isSecret} tone={tone}>
                {text}
              </Numerals>
            </View>
            <Words kind="label" tone={tone}>
              {name}
            </Words>
            <Words kind="help">{use}</Words>
          </View>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  slip: { columnGap: 3, rowGap: space[3], alignItems: 'flex-start' },
  line: { flexDirection: 'row', flexWrap: 'wrap' },
  part: { maxWidth: '100%' },
  text: {
    borderBottomWidth: 2,
    marginBottom: space[1],
    ...webStyle({ overflowWrap: 'anywhere' }),
  },
});
