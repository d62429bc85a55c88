import { Link } from 'expo-router';
import { StyleSheet, View } from 'react-native';

import { radius, space, useTheme } from '../ui/theme';
import { softColour } from '../ui/web-style';
import { Words } from '../ui/words';

/** The way to this system's curve: a link, so that it opens in another tab too. */
export function UseInCurves({ id }: { readonly id: string }) {
  const { colours } = useTheme();
  const fragment = `system=${id}`;
  return (
    <Link href={`/#${fragment}`} asChild>
      <View
        style={StyleSheet.flatten([styles.link, softColour, { backgroundColor: colours.well }])}
      >
        <Words kind="button" tone="onWell" numberOfLines={1}>
          Use in Curves
        </Words>
      </View>
    </Link>
  );
}

const styles = StyleSheet.create({
  link: {
    minHeight: 44,
    alignItems: 'center',
    justifyContent: 'center',
    paddingHorizontal: space[4],
    borderRadius: radius,
  },
});
