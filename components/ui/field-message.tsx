import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Icon } from './icon';
import { space } from './theme';
import { Words } from './words';

interface FieldMessageProps {
  readonly id: string;
  readonly help?: ReactNode;
  readonly error?: string | undefined;
}

/** The line under a field. It keeps its room when empty: nothing moves when an error comes. */
export function FieldMessage({ id, help, error }: FieldMessageProps) {
  return (
    <View style={styles.message} aria-live="polite">
      {error !== undefined && <Icon name="error" size={16} tone="bad" />}
      {(error ?? help) !== undefined && (
        <View style={styles.words}>
          <Words kind="help" tone={error === undefined ? undefined : 'bad'} nativeID={id}>
            {error ?? help}
          </Words>
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  message: { flexDirection: 'row', gap: space[1], marginTop: space[1], minHeight: 16 },
  words: { flex: 1 },
});
