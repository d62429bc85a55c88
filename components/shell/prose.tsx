import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '../ui/theme';
import { webStyle } from '../ui/web-style';
import { Words } from '../ui/words';

/** A column of text, about 70 characters wide and no wider. */
export function Prose({ children }: { readonly children: ReactNode }) {
  return <View style={styles.prose}>{children}</View>;
}

interface SectionProps {
  readonly heading: string;
  readonly children: ReactNode;
}

/** A part of a text under its own heading. */
export function Section({ heading, children }: SectionProps) {
  return (
    <View style={styles.section}>
      <Words kind="section" heading={2}>
        {heading}
      </Words>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  prose: {
    gap: space[8],
    flexGrow: 1,
    flexShrink: 1,
    ...webStyle({ flexBasis: 400, maxWidth: 480, minWidth: 0 }),
  },
  section: { gap: space[3] },
});
