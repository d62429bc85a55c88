import { StyleSheet, View } from 'react-native';
import type { Scope } from '../../shared/scopes';
import { Button } from '../ui/button';
import { CodeBlock } from '../ui/code-block';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { firstCall } from './first-call';

interface TryKeyProps {
  readonly value: string;
  readonly scopes: readonly Scope[];
  readonly onCopy: (call: string) => void;
}

/** A first call with this very key, ready to be pasted into a terminal. */
export function TryKey({ value, scopes, onCopy }: TryKeyProps) {
  const call = firstCall(window.location.origin, value);
  return (
    <View style={styles.part}>
      <Words kind="section" heading={3}>
        Try it
      </Words>
      {scopes.includes('compute') ? (
        <>
          <Words kind="help">Holds the key itself: for your own terminal, and nowhere else.</Words>
          <CodeBlock label="A first call with this key" code={call} />
          <View style={styles.row}>
            <Button icon="copy" label="Copy the call" onPress={() => onCopy(call)} />
          </View>
        </>
      ) : (
        <Words>
          A first call computes, which takes the scope compute. This key does not have it.
        </Words>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  part: { gap: space[2] },
  row: { flexDirection: 'row' },
});
