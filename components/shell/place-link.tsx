import { Link, usePathname } from 'expo-router';
import { useState, type ReactNode } from 'react';
import { StyleSheet, View, type StyleProp, type ViewStyle } from 'react-native';
import { softColour } from '../ui/web-style';
import { isWithin, type Place } from './places';

interface PlaceLinkProps {
  readonly place: Place;
  /** Called on the way there, such as to close what the link stands in. */
  readonly onGo?: () => void;
  readonly style: (state: { current: boolean; hovered: boolean }) => StyleProp<ViewStyle>;
  readonly children: (current: boolean) => ReactNode;
}

/** The way to the top of a place; says when it is the one on screen. */
export function PlaceLink({ place, onGo, style, children }: PlaceLinkProps) {
  const current = isWithin(place, usePathname());
  const [hovered, setHovered] = useState(false);
  return (
    <Link
      href={place.href}
      asChild
      onPress={() => {
        window.scrollTo(0, 0);
        onGo?.();
      }}
    >
      {/* A view, not a Pressable, whose own onClick would take the place of the link's. */}
      <View
        aria-current={current ? 'page' : undefined}
        onMouseEnter={() => setHovered(true)}
        onMouseLeave={() => setHovered(false)}
        // Link merges styles as plain objects: a list would be lost.
        style={StyleSheet.flatten([softColour, style({ current, hovered })])}
      >
        {children(current)}
      </View>
    </Link>
  );
}
