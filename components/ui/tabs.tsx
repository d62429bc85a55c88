import { useRef, type ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { space, useTheme } from './theme';
import { useLayout } from './use-layout';
import { softColour } from './web-style';
import { Words } from './words';

export interface Tab<Key extends string> {
  readonly key: Key;
  readonly label: ReactNode;
}

interface TabsProps<Key extends string> {
  /** What the tabs choose between. */
  readonly label: string;
  readonly tabs: readonly Tab<Key>[];
  readonly current: Key;
  readonly onChange: (key: Key) => void;
  /** Id of the panel the tabs change. */
  readonly panel?: string;
}

/** Moves of the keys, as an index among `count` tabs. */
const moves: Readonly<Record<string, (at: number, count: number) => number>> = {
  ArrowRight: (at, count) => (at + 1) % count,
  ArrowLeft: (at, count) => (at - 1 + count) % count,
  Home: () => 0,
  End: (_, count) => count - 1,
};

/** One of a few views. One Tab stop; arrows, Home and End move and choose. */
export function Tabs<Key extends string>({
  label,
  tabs,
  current,
  onChange,
  panel,
}: TabsProps<Key>) {
  const { colours } = useTheme();
  const { rail } = useLayout();
  const stops = useRef(new Map<Key, View>());
  const move = (event: React.KeyboardEvent) => {
    const at = tabs.findIndex(({ key }) => key === current);
    const next = tabs[moves[event.key]?.(at, tabs.length) ?? -1];
    if (!next) return;
    event.preventDefault();
    onChange(next.key);
    stops.current.get(next.key)?.focus();
  };
  return (
    <View
      role="tablist"
      aria-label={label}
      onKeyDown={move}
      style={[styles.list, rail && styles.wide]}
    >
      {tabs.map(({ key, label: word }) => {
        const chosen = key === current;
        return (
          <Pressable
            key={key}
            ref={(stop: View | null) => {
              if (stop) stops.current.set(key, stop);
              else stops.current.delete(key);
            }}
            role="tab"
            aria-selected={chosen}
            aria-controls={panel}
            tabIndex={chosen ? 0 : -1}
            onPress={() => onChange(key)}
            style={[
              styles.tab,
              !rail && styles.fill,
              softColour,
              { borderBottomColor: chosen ? colours.ink : 'transparent' },
            ]}
          >
            <Words
              kind={chosen ? 'button' : 'body'}
              tone={chosen ? 'ink' : 'inkSoft'}
              numberOfLines={1}
            >
              {word}
            </Words>
          </Pressable>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  list: { flexDirection: 'row' },
  wide: { gap: space[6] },
  tab: {
    minHeight: 44,
    alignItems: 'center',
    justifyContent: 'center',
    borderTopWidth: 3,
    borderTopColor: 'transparent',
    borderBottomWidth: 3,
  },
  fill: { flexGrow: 1, flexShrink: 1, paddingHorizontal: space[1] },
});
