import { StyleSheet, Text } from 'react-native';
import { Raised } from './raised';
import { useSurroundingText } from './text-context';
import { fonts, useTheme, type Colours } from './theme';
import { webStyle } from './web-style';

/** How a symbol is set: upright and italic runs, and how it is said. */
const quantities = {
  alpha: { italic: '\u03b1', spoken: 'alpha' },
  beta: { italic: '\u03b2', spoken: 'beta' },
  meanCharge: { italic: 'z\u0304', spoken: 'mean charge' },
  firstCharge: { italic: 'z', index: '0', spoken: 'charge of the fully protonated form' },
  concentration: { italic: 'c', spoken: 'concentration' },
  ionicStrength: { italic: 'I', spoken: 'ionic strength' },
  activity: { italic: 'a', spoken: 'activity' },
  activityCoefficient: { italic: '\u03b3', spoken: 'activity coefficient' },
  pK: { upright: 'p', italic: 'K', spoken: 'p K' },
  pKa: { upright: 'p', italic: 'K', index: 'a', spoken: 'p K a' },
  deltaH: { upright: 'Δ', italic: 'H', degree: true, spoken: 'standard enthalpy change' },
  deltaCp: {
    upright: 'Δ',
    italic: 'C',
    index: 'p',
    degree: true,
    spoken: 'standard heat capacity change',
  },
  uncertainty: { italic: 'u', spoken: 'standard uncertainty' },
  pKw: { upright: 'p', italic: 'K', index: 'w', spoken: 'p K w' },
  pKStandard: { upright: 'p', italic: 'K', degree: true, spoken: 'p K standard' },
  isoelectricPoint: { upright: 'p', italic: 'I', spoken: 'isoelectric point p I' },
  pKPrime: { upright: 'p', italic: 'K', prime: true, spoken: 'p K prime' },
} as const;

interface QuantityProps {
  readonly of: keyof typeof quantities;
  /** Subscript, such as the number of a constant. */
  readonly index?: string | number;
  /** px; default that of the text around, or 15. */
  readonly size?: number;
  readonly bold?: boolean;
  readonly tone?: keyof Colours;
}

/**
 * The symbol of a quantity, italic as quantities are, in the font that has its glyphs: Greek, the
 * macron and the prime exist only in the numerals' font.
 */
export function Quantity({ of, index, size, bold, tone }: QuantityProps) {
  const { colours } = useTheme();
  const around = useSurroundingText();
  const symbol: {
    upright?: string;
    italic: string;
    index?: string;
    prime?: boolean;
    degree?: boolean;
    spoken: string;
  } = quantities[of];
  const subscript = [symbol.index, index].filter((part) => part !== undefined).join('');
  return (
    <Text
      role="img"
      aria-label={[symbol.spoken, index].filter((part) => part !== undefined).join(' ')}
      style={[
        styles.symbol,
        { color: colours[tone ?? around?.tone ?? 'ink'], fontSize: size ?? around?.size ?? 15 },
        bold && styles.bold,
      ]}
    >
      {symbol.upright}
      <Text style={styles.italic}>{symbol.italic}</Text>
      {symbol.prime && <Text style={styles.prime}>′</Text>}
      {symbol.degree && <Raised place="sup">°</Raised>}
      {subscript !== '' && <Raised place="sub">{subscript}</Raised>}
    </Text>
  );
}

const styles = StyleSheet.create({
  symbol: { fontFamily: fonts.numbers },
  bold: { fontWeight: '700' },
  italic: { fontStyle: 'italic' },
  // The glyph stands in the middle of a full cell: drawn to the letter, and its index to it.
  prime: webStyle({ marginLeft: '-0.12em', marginRight: '-0.24em' }),
});
