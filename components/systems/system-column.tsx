import { Link } from 'expo-router';
import { useEffect, useRef, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Icon } from '../ui/icon';
import { space } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { useScrollKept } from '../ui/use-scroll-kept';
import { Words } from '../ui/words';

/**
 * What stands around a system: beside the list, a region that the focus is sent to; on its own, the
 * way up to the list, which an address that was opened directly has no history for.
 */
export function SystemColumn({ children }: { readonly children: ReactNode }) {
  const { rail, readOutAside: beside } = useLayout();
  useScrollKept();
  const column = useRef<HTMLElement>(null);
  useEffect(() => {
    const isOpened = document.activeElement === document.body;
    if (!beside || isOpened) return;
    // After the shell has sent the focus to the page, whose first part is the list.
    queueMicrotask(() => column.current?.focus({ preventScroll: true }));
  }, [beside]);
  return (
    <section ref={column} tabIndex={-1} aria-label="System" style={{ outline: 'none' }}>
      {!beside && (
        <Link href="/systems" style={rail ? styles.upWide : styles.up}>
          <View style={styles.upRow}>
            <View style={styles.left}>
              <Icon name="chevron-down" size={16} tone="well" />
            </View>
            <Words kind="button" tone="well">
              Systems
            </Words>
          </View>
        </Link>
      )}
      {children}
    </section>
  );
}

const styles = StyleSheet.create({
  up: { paddingHorizontal: space[4], alignSelf: 'flex-start' },
  upWide: { paddingHorizontal: space[6], alignSelf: 'flex-start' },
  upRow: { flexDirection: 'row', alignItems: 'center', gap: space[1], minHeight: 44 },
  left: { transform: [{ rotate: '90deg' }] },
});
