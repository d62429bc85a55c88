import { useState } from 'react';
import type { DimensionValue } from 'react-native';
import { Field } from '../ui/field';
import { useFaulty } from './faulty-fields';
import { inUnit, typedQuantity, type AskedQuantity } from './typed-quantity';

interface QuantityFieldProps {
  readonly label: string;
  readonly asked: AskedQuantity;
  /** In the dimension's own unit. */
  readonly value: string;
  readonly onChange: (value: string) => void;
  readonly help?: string | undefined;
  /** What the service said of the value; what is wrong with the text itself comes first. */
  readonly error?: string | undefined;
  readonly width?: DimensionValue;
}

const nothing = { text: '', at: '', left: true };
/** What may yet become a quantity while it is typed. */
const unfinished = /^\s*[-\u2212]?(\d+[.,])?$/;

/**
 * A quantity to type, with any of its units. What is typed stands as typed until the field is left,
 * and counts as soon as it can be read.
 */
export function QuantityField(props: QuantityFieldProps) {
  const { label, asked, value, onChange, help, error, width } = props;
  const [typed, setTyped] = useState(nothing);
  const own = typed.at === value ? typed : undefined;
  const result = own && typedQuantity(own.text, asked);
  const waits = own && !own.left && unfinished.test(own.text);
  const fault = result && !result.ok && !waits ? result.error : error;

  useFaulty(result !== undefined && !result.ok);

  const type = (text: string) => {
    const next = typedQuantity(text, asked);
    setTyped({ text, at: next.ok ? next.value : value, left: false });
    if (next.ok && next.value !== value) onChange(next.value);
  };
  const leave = () => setTyped(result?.ok ? nothing : { ...typed, left: true });

  return (
    <Field
      label={label}
      unit={asked.unit}
      inputMode="text"
      value={own ? own.text : inUnit(value, asked).replace('-', '\u2212')}
      onChangeText={type}
      onSubmit={leave}
      onBlur={leave}
      selectOnFocus
      {...(help === undefined ? {} : { help })}
      {...(fault === undefined ? {} : { error: fault })}
      {...(width === undefined ? {} : { width })}
    />
  );
}
