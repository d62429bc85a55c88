import { StyleSheet } from 'react-native';
import { CurvesLink } from '../curves/curves-link';
import { radius, space, useTheme } from '../ui/theme';
import { softColour } from '../ui/web-style';
import { Words } from '../ui/words';

/** The way to this system's curve. */
export function UseInCurves({ id }: { readonly id: string }) {
  const { colours } = useTheme();
  return (
    <CurvesLink
      choice={{ kind: 'stored', id }}
      style={[styles.link, softColour, { backgroundColor: colours.well }]}
    >
      <Words kind="button" tone="onWell" numberOfLines={1}>
        Use in Curves
      </Words>
    </CurvesLink>
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
