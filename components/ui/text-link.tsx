import { StyleSheet, Text } from 'react-native';
import { fonts, useTheme } from './theme';
import { webStyle } from './web-style';

interface TextLinkProps {
  /** An address outside the app's own places, such as `/docs`. */
  readonly href: string;
  readonly children: string;
}

/** A link within a text. */
export function TextLink({ href, children }: TextLinkProps) {
  const { colours } = useTheme();
  return (
    <Text href={href} style={[styles.link, { color: colours.well }]}>
      {children}
    </Text>
  );
}

const styles = StyleSheet.create({
  link: {
    fontFamily: fonts.words,
    textDecorationLine: 'underline',
    // A space that ends a line is not underlined.
    ...webStyle({ whiteSpace: 'normal' }),
  },
});
