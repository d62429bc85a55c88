/// <reference types="expo/types" />
import type { KeyboardEvent, MouseEvent, Ref } from 'react';

/**
 * What react-native-web forwards to the DOM beyond React Native's own props (its list:
 * modules/forwardedProps). Only what the app uses; everything here needs a reason.
 */
declare module 'react-native' {
  interface AccessibilityProps {
    'aria-activedescendant'?: string | undefined;
    'aria-autocomplete'?: 'list' | undefined;
    'aria-controls'?: string | undefined;
    'aria-current'?: 'page' | undefined;
    'aria-describedby'?: string | undefined;
    'aria-haspopup'?: 'listbox' | 'dialog' | 'menu' | undefined;
    'aria-invalid'?: boolean | undefined;
    'aria-level'?: number | undefined;
    'aria-orientation'?: 'horizontal' | 'vertical' | undefined;
    'aria-pressed'?: boolean | undefined;
  }

  interface ViewProps {
    dataSet?: Record<string, string> | undefined;
    href?: string | undefined;
    onClick?: ((event: MouseEvent) => void) | undefined;
    onKeyDown?: ((event: KeyboardEvent) => void) | undefined;
    onMouseDown?: ((event: MouseEvent) => void) | undefined;
    onMouseEnter?: (() => void) | undefined;
    onMouseLeave?: (() => void) | undefined;
    ref?: Ref<View> | undefined;
  }

  interface TextProps {
    href?: string | undefined;
    hrefAttrs?: { download?: string; rel?: string; target?: string } | undefined;
  }
}
