import { StyleSheet, View } from 'react-native';
import { Icon } from '../ui/icon';
import { space, useTheme } from '../ui/theme';
import { webStyle } from '../ui/web-style';
import { Words } from '../ui/words';
import { PlaceLink } from './place-link';
import { places } from './places';

/** Height of the bar in px, without what a phone's own bar takes below it. */
export const barHeight = 64;

/** The places at the thumb, below 900 px. */
export function Bar() {
  const { colours } = useTheme();
  return (
    <View
      role="navigation"
      aria-label="Places"
      style={[styles.bar, { backgroundColor: colours.page, borderTopColor: colours.rule }]}
    >
      {places.map((place) => (
        <PlaceLink
          key={place.href}
          place={place}
          style={({ current }) => [
            styles.place,
            { borderTopColor: current ? colours.well : 'transparent' },
          ]}
        >
          {(current) => (
            <>
              <Icon name={place.icon} size={24} tone={current ? 'well' : 'inkSoft'} />
              <Words kind="help" tone={current ? 'well' : 'inkSoft'}>
                {place.label}
              </Words>
            </>
          )}
        </PlaceLink>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  bar: {
    flexDirection: 'row',
    borderTopWidth: 1,
    paddingHorizontal: space[3],
    ...webStyle({
      position: 'sticky',
      bottom: 0,
      zIndex: 2,
      paddingBottom: 'env(safe-area-inset-bottom)',
    }),
  },
  place: {
    flexGrow: 1,
    flexBasis: 0,
    height: barHeight - 1,
    alignItems: 'center',
    justifyContent: 'center',
    gap: space[1],
    // The tread lies on the bar's own line.
    marginTop: -1,
    borderTopWidth: 3,
  },
});
