import { Link } from 'expo-router';
import type { ReactNode } from 'react';
import { StyleSheet, View, type StyleProp, type ViewStyle } from 'react-native';
import type { Choice } from '../constants/choice';
import { firstState } from './curves-state';
import { formatFragment } from './fragment';
import { openNext } from './use-address';

interface CurvesLinkProps {
  readonly choice: Choice;
  readonly style?: StyleProp<ViewStyle>;
  readonly children: ReactNode;
}

/** The way to the curve of a system; a link, so that it opens in another tab too. */
export function CurvesLink({ choice, style, children }: CurvesLinkProps) {
  const fragment = formatFragment({ ...firstState, choice });
  return (
    <Link href={`/#${fragment}`} asChild onPress={() => openNext(fragment)}>
      {/* A view, not a Pressable, whose own onClick would take the place of the link's. */}
      <View style={StyleSheet.flatten(style)}>{children}</View>
    </Link>
  );
}
