import { StyleSheet, Text } from 'react-native';
import { useSurroundingText } from './text-context';
import { webStyle } from './web-style';

interface RaisedProps {
  readonly place: 'sub' | 'sup';
  readonly children: string;
}

/**
 * A subscript or superscript that leaves the line's height alone. Drawn by shifting: the fonts
 * have no Unicode sub- and superscripts of their own.
 */
export function Raised({ place, children }: RaisedProps) {
  const size = useSurroundingText()?.size ?? 15;
  return (
    <Text style={[styles.raised, { fontSize: size * 0.72, top: size * shift[place] }]}>
      {children}
    </Text>
  );
}

const shift = { sub: 0.2, sup: -0.36 } as const;
const styles = StyleSheet.create({
  raised: webStyle({ lineHeight: '0px', position: 'relative' }),
});
