import { useEffect, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { space, useTheme } from './theme';

interface SkeletonProps {
  /** What is being waited for. */
  readonly label: string;
  readonly lines?: number;
}

const patience = 300;
const widths = ['70%', '100%', '85%', '92%'] as const;

/** Bars where text will stand. Only after 300 ms: a short wait should not flicker. */
export function Skeleton({ label, lines = 4 }: SkeletonProps) {
  const { colours } = useTheme();
  const [shown, setShown] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setShown(true), patience);
    return () => clearTimeout(timer);
  }, []);
  return (
    <View role="status" aria-label={shown ? label : undefined} aria-busy style={styles.bars}>
      {shown &&
        Array.from({ length: lines }, (_, line) => (
          <View
            key={line}
            style={[
              styles.bar,
              { width: widths[line % widths.length], backgroundColor: colours.stone },
            ]}
          />
        ))}
    </View>
  );
}

const styles = StyleSheet.create({
  bars: { gap: space[2] },
  bar: { height: 12, borderRadius: 3 },
});
