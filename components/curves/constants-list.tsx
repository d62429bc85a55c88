import { StyleSheet, View } from 'react-native';
import { Button } from '../ui/button';
import { Quantity } from '../ui/quantity';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import type { Example } from './examples';
import { ValueRow } from './read-out-row';

interface ConstantsListProps {
  readonly example: Example;
  readonly onTypeOwn: () => void;
}

/** An example's constants as given, and where they are from. */
export function ConstantsList({ example, onTypeOwn }: ConstantsListProps) {
  const { system, source, note } = example;
  return (
    <View style={styles.list}>
      <View role="table" aria-label="Constants">
        {system.pKa.map((value, i) => (
          <ValueRow key={i} label={<Quantity of="pKa" index={i + 1} />} value={value} />
        ))}
      </View>
      <Words kind="help">{source}</Words>
      {note !== undefined && <Words kind="help">{note}</Words>}
      <View style={styles.own}>
        <Button kind="quiet" label="Change these constants" onPress={onTypeOwn} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  list: { gap: space[2] },
  own: { alignItems: 'flex-start' },
});
