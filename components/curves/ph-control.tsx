import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { cursorMove } from '../chart/cursor-keys';
import { Button } from '../ui/button';
import { Field, type FieldKey } from '../ui/field';
import { space } from '../ui/theme';
import type { PHRange } from './ph-steps';
import { pHStep, typedPH } from './ph-steps';
import { trueMinus } from './rounded';

interface PhControlProps {
  readonly pH: string;
  readonly range: PHRange;
  readonly onMove: (pH: string) => void;
}

/** What may yet become a number while it is typed. */
const unfinished = /^\s*[-\u2212]?(\d+[.,])?$/;
const nothing = { text: '', at: '', left: true };
/** Keys that a line of text needs for itself. */
const ownKeys = new Set(['ArrowLeft', 'ArrowRight', 'Home', 'End']);

/** The pH typed, or stepped at the thumb. */
export function PhControl({ pH, range, onMove }: PhControlProps) {
  // What is typed stands as typed for as long as the cursor is where it put it.
  const [typed, setTyped] = useState(nothing);
  const own = typed.at === pH ? typed : undefined;
  const result = own && typedPH(own.text, range);
  const waits = own && !own.left && unfinished.test(own.text);
  const error = result && !result.ok && !waits ? result.error : undefined;

  const type = (text: string) => {
    const next = typedPH(text, range);
    setTyped({ text, at: next.ok ? next.pH : pH, left: false });
    if (next.ok) onMove(next.pH);
  };
  const leave = () => setTyped(result?.ok ? nothing : { ...typed, left: true });
  const step = (by: string, sign: 1 | -1) => onMove(pHStep(pH, by, sign, range));
  const key = (event: FieldKey) => {
    const move = ownKeys.has(event.key) ? undefined : cursorMove(event.key, event.shiftKey);
    if (!move || !('by' in move)) return;
    event.preventDefault();
    step(move.by, move.sign);
  };
  return (
    <View style={styles.row}>
      <Button
        label="Lower the pH by 0.01"
        icon="minus"
        size="main"
        hideLabel
        onPress={() => step('0.01', -1)}
      />
      <View style={styles.field}>
        <Field
          label="pH"
          hideLabel
          lead="pH"
          size="main"
          inputMode="decimal"
          value={own ? own.text : trueMinus(pH)}
          onChangeText={type}
          onKeyDown={key}
          onSubmit={leave}
          onBlur={leave}
          {...(error === undefined ? {} : { error })}
        />
      </View>
      <Button
        label="Raise the pH by 0.01"
        icon="plus"
        size="main"
        hideLabel
        onPress={() => step('0.01', 1)}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', gap: space[2], alignItems: 'flex-start' },
  field: { flex: 1, minWidth: 0 },
});
