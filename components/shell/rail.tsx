import { StyleSheet, View } from 'react-native';
import { Icon } from '../ui/icon';
import { Mark } from '../ui/mark';
import { space, useTheme } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { webStyle } from '../ui/web-style';
import { Words } from '../ui/words';
import { PlaceLink } from './place-link';
import type { Place } from './places';
import { RailAccount } from './rail-account';
import { usePlaces } from './use-places';

const widths = { narrow: 72, wide: 184 } as const;

/** The places at the side, from 900 px: icons over words, from 1200 px words alone. */
export function Rail() {
  const { colours } = useTheme();
  const { readOutAside: wide } = useLayout();
  const places = usePlaces();
  return (
    <View
      role="navigation"
      aria-label="Places"
      style={[
        styles.rail,
        { width: wide ? widths.wide : widths.narrow, borderRightColor: colours.rule },
      ]}
    >
      <View style={[styles.name, wide && styles.nameWide]}>
        <Mark size={28} />
        {wide && <Words kind="section">Stepwell</Words>}
      </View>
      {places.map((place) => (
        <PlaceLink
          key={place.href}
          place={place}
          style={({ current, hovered }) => [
            styles.place,
            wide ? styles.placeWide : styles.placeNarrow,
            { borderBottomColor: current ? colours.well : 'transparent' },
            hovered && !current && { backgroundColor: colours.raised },
          ]}
        >
          {(current) =>
            wide ? (
              <WidePlace place={place} current={current} />
            ) : (
              <>
                <Icon name={place.icon} size={24} tone={current ? 'well' : 'inkSoft'} />
                <Words kind="help" tone={current ? 'well' : 'inkSoft'}>
                  {place.label}
                </Words>
              </>
            )
          }
        </PlaceLink>
      ))}
      <RailAccount wide={wide} />
    </View>
  );
}

function WidePlace({ place, current }: { readonly place: Place; readonly current: boolean }) {
  return (
    <>
      <Words kind={current ? 'button' : 'body'}>{place.label}</Words>
      {current && <Words kind="help">{place.question}</Words>}
    </>
  );
}

const styles = StyleSheet.create({
  rail: {
    borderRightWidth: 1,
    ...webStyle({ position: 'sticky', top: 0, height: '100dvh', overflowY: 'auto', zIndex: 1 }),
  },
  name: {
    height: 76,
    alignItems: 'center',
    paddingTop: space[5],
  },
  nameWide: {
    flexDirection: 'row',
    alignItems: 'flex-start',
    gap: space[2],
    paddingLeft: space[6],
  },
  place: { borderBottomWidth: 3, outlineOffset: -3 },
  placeNarrow: { height: 64, alignItems: 'center', justifyContent: 'center', gap: space[1] },
  // The tread runs from the word to the rail's line.
  placeWide: {
    marginLeft: space[6],
    paddingRight: space[4],
    paddingVertical: 5,
  },
});
