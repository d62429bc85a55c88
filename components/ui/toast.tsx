import { createContext, useCallback, useContext, useEffect, useState, type ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { Icon } from './icon';
import { radius, space, useTheme } from './theme';
import { webStyle } from './web-style';
import { Words } from './words';

/** What was done, with a way back where there is one. */
export interface ToastMessage {
  readonly text: string;
  readonly undo?: () => void;
}

const Say = createContext<(message: ToastMessage) => void>(() => undefined);

/** Says that something was done: `say({ text: 'Link copied' })`. */
export const useToast = () => useContext(Say);

const shownFor = 6000;

interface ToastProviderProps {
  /** Distance from the foot of the window, a CSS length. */
  readonly bottom: string;
  readonly children: ReactNode;
}

/** Gives its children `useToast` and shows, at the foot of the window, what they say. */
export function ToastProvider({ bottom, children }: ToastProviderProps) {
  const [message, setMessage] = useState<ToastMessage>();
  const [held, setHeld] = useState(false);
  const say = useCallback((next: ToastMessage) => setMessage(next), []);
  useEffect(() => {
    if (!message || held) return;
    const timer = setTimeout(() => setMessage(undefined), shownFor);
    return () => clearTimeout(timer);
  }, [message, held]);
  return (
    <Say value={say}>
      {children}
      <Toast
        message={message}
        bottom={bottom}
        onHold={setHeld}
        onClose={() => setMessage(undefined)}
      />
    </Say>
  );
}

interface ToastProps {
  readonly message: ToastMessage | undefined;
  readonly bottom: string;
  /** The pointer or the focus rests on it: it must not go away. */
  readonly onHold: (held: boolean) => void;
  readonly onClose: () => void;
}

function Toast({ message, bottom, onHold, onClose }: ToastProps) {
  const { colours } = useTheme();
  const undo = message?.undo;
  return (
    <View role="status" style={[styles.place, webStyle({ bottom })]}>
      {message && (
        <View
          style={[
            styles.toast,
            { backgroundColor: colours.ink },
            webStyle({ boxShadow: `0 8px 24px ${colours.shadow}` }),
          ]}
        >
          <Icon name="check" tone="page" />
          <View style={styles.words}>
            <Words tone="page">{message.text}</Words>
          </View>
          {undo && (
            <Pressable
              role="button"
              onFocus={() => onHold(true)}
              onBlur={() => onHold(false)}
              onHoverIn={() => onHold(true)}
              onHoverOut={() => onHold(false)}
              onPress={() => {
                undo();
                onClose();
              }}
              style={styles.undo}
            >
              <Words kind="button" tone="page">
                Undo
              </Words>
            </Pressable>
          )}
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  place: {
    left: 0,
    right: 0,
    alignItems: 'center',
    paddingHorizontal: space[4],
    pointerEvents: 'box-none',
    ...webStyle({ position: 'fixed', zIndex: 3 }),
  },
  toast: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space[3],
    minHeight: 48,
    maxWidth: 480,
    paddingHorizontal: space[4],
    borderRadius: radius,
  },
  words: { flexShrink: 1 },
  undo: { minHeight: 44, justifyContent: 'center' },
});
