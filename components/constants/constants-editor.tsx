import { useRef } from 'react';
import { StyleSheet, View, type TextInput } from 'react-native';
import { limits } from '../../shared/limits';
import { Button } from '../ui/button';
import { Field } from '../ui/field';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { ConstantRow } from './constant-row';
import type { DraftEditing } from './use-constants-draft';

/** A system of one's own: name, charge, constants. What is shown follows each edit it can. */
export function ConstantsEditor({ draft, faults, edit }: DraftEditing) {
  const inputs = useRef<(TextInput | null)[]>([]);
  const { pKa } = draft;
  const setRows = (rows: readonly string[]) => edit({ ...draft, pKa: rows });
  const focus = (row: number) => inputs.current[row]?.focus();
  const full = pKa.length >= limits.protons;
  const add = () => {
    if (full) return;
    setRows([...pKa, '']);
    // The new input is there after this commit.
    requestAnimationFrame(() => focus(pKa.length));
  };
  return (
    <View style={styles.editor}>
      <Field
        label="Name"
        kind="words"
        value={draft.name}
        onChangeText={(name) => edit({ ...draft, name })}
        {...(faults.name === undefined ? {} : { error: faults.name })}
      />
      <Field
        label="Charge of the fully protonated form"
        value={draft.charge}
        onChangeText={(charge) => edit({ ...draft, charge })}
        {...(faults.charge === undefined ? {} : { error: faults.charge })}
      />
      <View style={styles.rows}>
        <Words kind="label">Constants, in the order in which protons leave</Words>
        {pKa.map((value, row) => (
          <ConstantRow
            key={row}
            ref={(input) => {
              inputs.current[row] = input;
            }}
            number={row + 1}
            value={value}
            error={faults.pKa[row]}
            onChange={(text) => setRows(pKa.with(row, text))}
            onPasteList={(values) => setRows([...pKa.slice(0, row), ...values])}
            onSubmit={() => (row === pKa.length - 1 ? add() : focus(row + 1))}
            onRemove={
              pKa.length > 1
                ? () => {
                    setRows(pKa.filter((_, i) => i !== row));
                    focus(Math.max(0, row - 1));
                  }
                : undefined
            }
          />
        ))}
        <Words kind="help">A pasted list takes the place of its row and of all below it.</Words>
        <View style={styles.add}>
          <Button
            icon="plus"
            label="Add a constant"
            disabled={full}
            why={`A system has at most ${limits.protons} constants here.`}
            onPress={add}
          />
        </View>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  editor: { gap: space[2] },
  rows: { gap: space[2] },
  add: { alignItems: 'flex-start' },
});
