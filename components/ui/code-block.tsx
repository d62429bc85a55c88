import { StyleSheet, Text, View } from 'react-native';
import { Numerals } from './numerals';
import { ScrollBox } from './scroll-box';
import { radius, space, useTheme } from './theme';
import { webStyle } from './web-style';

interface CodeBlockProps {
  readonly code: string;
  /** What the code is: "The request in curl". */
  readonly label: string;
}

/** Code as it is to be typed; long lines scroll inside it. */
export function CodeBlock({ code, label }: CodeBlockProps) {
  const { colours } = useTheme();
  return (
    <View style={[styles.block, { backgroundColor: colours.raised }]}>
      <ScrollBox label={label}>
        <View style={styles.code}>
          <Numerals size={13}>
            <Text style={styles.lines}>{code}</Text>
          </Numerals>
        </View>
      </ScrollBox>
    </View>
  );
}

const styles = StyleSheet.create({
  block: { borderRadius: radius },
  code: { padding: space[3], ...webStyle({ width: 'max-content' }) },
  lines: webStyle({ whiteSpace: 'pre' }),
});
