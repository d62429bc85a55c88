import type { ReactNode } from 'react';
import { StyleSheet, Text } from 'react-native';
import { SurroundingTextProvider, useSurroundingText } from './text-context';
import { fonts, useTheme, type Colours } from './theme';
import { useLayout } from './use-layout';

export type WordsKind = 'display' | 'title' | 'section' | 'body' | 'button' | 'label' | 'help';

interface WordsProps {
  /** Default `body`; nested in other text, default as around it. */
  readonly kind?: WordsKind;
  readonly tone?: keyof Colours;
  /** Makes it a heading of that level: one `1` a route. */
  readonly heading?: 1 | 2 | 3;
  readonly numberOfLines?: number;
  readonly nativeID?: string;
  readonly children: ReactNode;
}

/** Text in words, on the type scale. */
export function Words({ kind, tone, heading, numberOfLines, nativeID, children }: WordsProps) {
  const { colours } = useTheme();
  const { rail } = useLayout();
  const around = useSurroundingText();
  const shownKind = kind ?? (around ? undefined : 'body');
  const style = shownKind === 'title' && !rail ? styles.titlePhone : shownKind && styles[shownKind];
  const shownTone = tone ?? around?.tone ?? (shownKind === 'help' ? 'inkSoft' : 'ink');
  return (
    <SurroundingTextProvider
      value={{
        size: style?.fontSize ?? around?.size ?? styles.body.fontSize,
        tone: shownTone,
        strong: style ? style.fontWeight === '600' : (around?.strong ?? false),
      }}
    >
      <Text
        nativeID={nativeID}
        numberOfLines={numberOfLines}
        role={heading && 'heading'}
        aria-level={heading}
        style={[{ fontFamily: fonts.words, color: colours[shownTone] }, style]}
      >
        {children}
      </Text>
    </SurroundingTextProvider>
  );
}

const styles = StyleSheet.create({
  display: { fontSize: 40, lineHeight: 44, fontWeight: '600', letterSpacing: -0.8 },
  title: { fontSize: 26, lineHeight: 32, fontWeight: '600' },
  titlePhone: { fontSize: 20, lineHeight: 26, fontWeight: '600' },
  section: { fontSize: 17, lineHeight: 24, fontWeight: '600' },
  body: { fontSize: 15, lineHeight: 22, fontWeight: '400' },
  button: { fontSize: 15, lineHeight: 22, fontWeight: '600' },
  label: { fontSize: 13, lineHeight: 18, fontWeight: '600' },
  help: { fontSize: 12, lineHeight: 16, fontWeight: '400' },
});
