import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { limits } from '../../shared/limits';
import { plainSystem } from '../constants/choice';
import { SystemCombobox } from '../handbook/system-combobox';
import { Button } from '../ui/button';
import { space } from '../ui/theme';
import type { MixtureState, WeighedPart } from './mixture-state';
import { firstConcentration } from './mixture-state';

interface AddComponentProps extends Pick<MixtureState, 'parts'> {
  readonly onAdd: (part: WeighedPart) => void;
}

/** Puts another acid or base into the flask: found in the handbook, or typed. */
export function AddComponent({ parts, onAdd }: AddComponentProps) {
  const [choosing, setChoosing] = useState(false);
  const full = parts.length >= limits.components;
  const add = (choice: WeighedPart['choice']) => {
    setChoosing(false);
    onAdd({ choice, concentration: parts.at(-1)?.concentration ?? firstConcentration });
  };
  if (!choosing || full) {
    return (
      <View style={styles.start}>
        <Button
          kind="quiet"
          icon="plus"
          label="Add a component"
          disabled={full}
          why={`A flask has at most ${limits.components} components here.`}
          onPress={() => setChoosing(true)}
        />
      </View>
    );
  }
  return (
    <View style={styles.choosing}>
      <View style={styles.field}>
        <SystemCombobox
          label="New component"
          value=""
          startsOpen
          onPick={(id) => add({ kind: 'stored', id })}
          onTypeOwn={() => add({ kind: 'typed', system: plainSystem })}
        />
      </View>
      <View style={styles.cancel}>
        <Button
          kind="quiet"
          icon="close"
          hideLabel
          label="Add nothing"
          onPress={() => setChoosing(false)}
        />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  start: { alignItems: 'flex-start' },
  choosing: { flexDirection: 'row', gap: space[2], paddingTop: space[2] },
  field: { flex: 1, minWidth: 0 },
  // Level with the field, under the height of its label.
  cancel: { marginTop: 24 },
});
