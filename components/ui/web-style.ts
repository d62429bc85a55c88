import type { CSSProperties } from 'react';
import type { TextStyle, ViewStyle } from 'react-native';

/**
 * A style that only the web has (`position: fixed`, `white-space`, em lengths). react-native-web
 * passes it on as it is; React Native's types do not know it.
 */
export const webStyle = (style: CSSProperties) => style as ViewStyle & TextStyle;

/** Colour changes take 120 ms; base.css sets all durations to 0 under reduced motion. */
export const softColour = webStyle({
  transitionProperty: 'background-color, border-color, color',
  transitionDuration: '120ms',
  transitionTimingFunction: 'ease-out',
});
