import { Link, usePathname } from 'expo-router';
import type { ReactNode } from 'react';
import { Pressable, type StyleProp, type ViewStyle } from 'react-native';
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
  return (
    <Link href={place.href} asChild>
      <Pressable
        role="link"
        aria-current={current ? 'page' : undefined}
        style={({ hovered }) => [softColour, style({ current, hovered })]}
      >
        {children(current)}
      </Pressable>
    </Link>
  );
}
