import { StyleSheet, View } from 'react-native';
import { space, useTheme } from '../ui/theme';
import { webStyle } from '../ui/web-style';
import { BarEnd } from './bar-end';
import { BarItem, barHeight, barSlot } from './bar-item';
import { PlaceLink } from './place-link';
import { barPlaces } from './places';
import { usePlaces } from './use-places';

export { barHeight };

/** The places at the thumb, below 900 px. */
export function Bar() {
  const { colours } = useTheme();
  const { shown, behind } = barPlaces(usePlaces());
  return (
    <View
      role="navigation"
      aria-label="Places"
      style={[styles.bar, { backgroundColor: colours.page, borderTopColor: colours.rule }]}
    >
      {shown.map((place) => (
        <PlaceLink
          key={place.href}
          place={place}
          style={({ current }) => [
            barSlot,
            { borderTopColor: current ? colours.well : 'transparent' },
          ]}
        >
          {(current) => <BarItem icon={place.icon} label={place.label} current={current} />}
        </PlaceLink>
      ))}
      <BarEnd behind={behind} />
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
});
