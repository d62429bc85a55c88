import { Link } from 'expo-router';
import type { ReactNode } from 'react';
import { StyleSheet, View, type StyleProp, type ViewStyle } from 'react-native';
import { rememberAddress } from './return-address';

interface SignInLinkProps {
  readonly style?: StyleProp<ViewStyle>;
  readonly children: ReactNode;
}

/** The way to the sign-in page, and back to here, fragment and all, once signed in. */
export function SignInLink({ style, children }: SignInLinkProps) {
  return (
    <Link href="/sign-in" asChild onPress={rememberAddress}>
      {/* A view, not a Pressable, whose own onClick would take the place of the link's. */}
      <View style={StyleSheet.flatten(style)}>{children}</View>
    </Link>
  );
}
