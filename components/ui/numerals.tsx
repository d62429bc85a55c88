import type { ReactNode } from 'react';
import { StyleSheet, Text } from 'react-native';
import { numberParts, spokenNumber, type NumberParts } from './number';
import { SurroundingTextProvider, useSurroundingText } from './text-context';
import { fonts, useTheme, type Colours } from './theme';
import { Raised } from './raised';

const lineHeights = { 12: 16, 13: 20, 14: 20, 15: 22, 18: 28, 20: 26, 24: 30, 64: 64 } as const;
export type NumeralsSize = keyof typeof lineHeights;

interface NumeralsProps {
  /** px; default that of the text around, or 15. */
  readonly size?: NumeralsSize;
  readonly bold?: boolean;
  readonly tone?: keyof Colours;
  readonly numberOfLines?: number;
  readonly nativeID?: string;
  /** A number is set with a true minus and ×10ⁿ; anything else stays as it is. */
  readonly children: ReactNode;
}

/** Numbers, keys and code: every digit as wide as the next. */
export function Numerals({ size, bold, tone, numberOfLines, nativeID, children }: NumeralsProps) {
  const { colours } = useTheme();
  const around = useSurroundingText();
  const shownTone = tone ?? around?.tone ?? 'ink';
  const ownSize = size ?? (around ? undefined : 15);
  const strong = bold ?? around?.strong ?? false;
  const parts =
    typeof children === 'string' || typeof children === 'number'
      ? numberParts(String(children))
      : undefined;
  return (
    <SurroundingTextProvider
      value={{ size: ownSize ?? around?.size ?? 15, tone: shownTone, strong }}
    >
      <Text
        nativeID={nativeID}
        numberOfLines={numberOfLines}
        style={[
          styles.numerals,
          {
            color: colours[shownTone],
            // Medium is what stands level with semibold words, and with large sizes.
            fontWeight: bold ? '700' : strong || (ownSize ?? 0) >= 20 ? '500' : '400',
          },
          ownSize !== undefined && { fontSize: ownSize, lineHeight: lineHeights[ownSize] },
          ownSize === 64 && styles.answer,
        ]}
      >
        {parts ? <SetNumber parts={parts} /> : children}
      </Text>
    </SurroundingTextProvider>
  );
}

function SetNumber({ parts }: { readonly parts: NumberParts }) {
  if (parts.exponent === undefined) return parts.significand;
  return (
    <Text role="img" aria-label={spokenNumber(parts)}>
      {parts.significand}
      <Text style={styles.times}>×</Text>10
      <Raised place="sup">{parts.exponent}</Raised>
    </Text>
  );
}

const styles = StyleSheet.create({
  // calt is where JetBrains Mono keeps its ligatures.
  numerals: { fontFamily: fonts.numbers, fontFeatureSettings: '"calt" 0, "liga" 0' },
  answer: { letterSpacing: -1.92 },
  times: { marginHorizontal: 1 },
});
