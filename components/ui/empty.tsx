import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import Svg, { Path } from 'react-native-svg';
import { radius, space, useTheme } from './theme';
import { Words } from './words';

interface EmptyProps {
  /** What is not there yet. */
  readonly title: string;
  /** One sentence: what would fill it. */
  readonly children: string;
  readonly action?: ReactNode;
}

/** A place with nothing in it yet, and the one thing that fills it. */
export function Empty({ title, children, action }: EmptyProps) {
  const { colours } = useTheme();
  return (
    <View style={[styles.empty, { borderColor: colours.edge }]}>
      <Svg width={64} height={28} viewBox="0 0 64 28" fill="none" aria-hidden>
        <Path d="M1 2h16v8h16v8h16v8h14" stroke={colours.edge} strokeWidth={1.75} />
      </Svg>
      <Words kind="button">{title}</Words>
      <Words kind="help">{children}</Words>
      {action}
    </View>
  );
}

const styles = StyleSheet.create({
  empty: {
    alignItems: 'flex-start',
    gap: space[2],
    padding: space[4],
    borderWidth: 1,
    borderStyle: 'dashed',
    borderRadius: radius,
  },
});
