import { useEffect, useRef } from 'react';
import type { Ref } from 'react';
import { StyleSheet, View, type TextInput } from 'react-native';
import { Button } from '../ui/button';
import { elementOf } from '../ui/element';
import { Field } from '../ui/field';
import { Quantity } from '../ui/quantity';
import { space } from '../ui/theme';
import { pastedConstants } from './pasted-constants';

interface ConstantRowProps {
  /** From 1, in the order in which protons leave. */
  readonly number: number;
  readonly value: string;
  readonly error: string | undefined;
  readonly onChange: (value: string) => void;
  /** A list was pasted into this row. */
  readonly onPasteList: (values: readonly string[]) => void;
  readonly onSubmit: () => void;
  readonly onRemove: (() => void) | undefined;
  readonly ref: Ref<TextInput>;
}

/** One constant to type. */
export function ConstantRow(props: ConstantRowProps) {
  const { number, value, error, onChange, onPasteList, onSubmit, onRemove, ref } = props;
  const row = usePasteList(onPasteList);
  return (
    <View ref={row} style={styles.row}>
      <View style={styles.label} aria-hidden>
        <Quantity of="pKa" index={number} />
      </View>
      <View style={styles.field}>
        <Field
          ref={ref}
          label={`pKa ${number}`}
          hideLabel
          inputMode="text"
          value={value}
          onChangeText={onChange}
          onSubmit={onSubmit}
          {...(error === undefined ? {} : { error })}
        />
      </View>
      {onRemove && (
        <Button
          kind="quiet"
          icon="close"
          hideLabel
          label={`Remove pKa ${number}`}
          onPress={onRemove}
        />
      )}
    </View>
  );
}

/** A one-line input drops line breaks on paste, so a list is caught before it gets there. */
function usePasteList(onPasteList: (values: readonly string[]) => void) {
  const row = useRef<View>(null);
  useEffect(() => {
    const element = elementOf(row.current);
    const paste = (event: ClipboardEvent) => {
      const values = pastedConstants(event.clipboardData?.getData('text') ?? '');
      if (values.length < 2) return;
      event.preventDefault();
      onPasteList(values);
    };
    element?.addEventListener('paste', paste);
    return () => element?.removeEventListener('paste', paste);
  }, [onPasteList]);
  return row;
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'flex-start', gap: space[2] },
  label: { width: 34, height: 44, justifyContent: 'center' },
  field: { flex: 1, minWidth: 0 },
});
