import { Link, usePathname } from 'expo-router';
import { useState, type ReactNode } from 'react';
import { Pressable, StyleSheet, type StyleProp, type ViewStyle } from 'react-native';
import { softColour } from '../ui/web-style';
import type { Place } from './places';

interface PlaceLinkProps {
  readonly place: Place;
  readonly style: (state: { current: boolean; hovered: boolean }) => StyleProp<ViewStyle>;
  readonly children: (current: boolean) => ReactNode;
}

/** The way to a place; says when it is the one on screen. */
export function PlaceLink({ place, style, children }: PlaceLinkProps) {
  const current = usePathname() === place.href;
  const [hovered, setHovered] = useState(false);
  return (
    <Link href={place.href} asChild>
      <Pressable
        role="link"
        aria-current={current ? 'page' : undefined}
        onHoverIn={() => setHovered(true)}
        onHoverOut={() => setHovered(false)}
        // Link merges styles as plain objects: a function or a list would be lost.
        style={StyleSheet.flatten([softColour, style({ current, hovered })])}
      >
        {children(current)}
      </Pressable>
    </Link>
  );
}
