import { useId, useRef, useState, type ReactNode } from 'react';
import { StyleSheet, Text, View, type DimensionValue } from 'react-native';
import { choiceMove, typedOption, type ChoiceState } from './choice-keys';
import { ChoiceList, type Option } from './choice-list';
import { elementOf } from './element';
import { FieldMessage } from './field-message';
import { Icon } from './icon';
import { radius, space, useTheme } from './theme';
import { Words } from './words';

interface ChoiceProps<Value extends string> {
  readonly label: string;
  readonly options: readonly Option<Value>[];
  readonly value: Value;
  readonly onChange: (value: Value) => void;
  readonly help?: ReactNode;
  /** What is wrong with the choice; takes the place of the help. */
  readonly error?: string;
  readonly hideLabel?: boolean;
  readonly width?: DimensionValue;
}

/** One of a list, which opens under (or over) it; behaves as the platform's own does. */
export function Choice<Value extends string>({
  label,
  options,
  value,
  onChange,
  help,
  error,
  hideLabel = false,
  width,
}: ChoiceProps<Value>) {
  const { colours } = useTheme();
  const id = useId();
  const box = useRef<View>(null);
  const typed = useRef({ text: '', at: 0 });
  const chosen = options.findIndex((option) => option.value === value);
  const [state, setState] = useState<ChoiceState>({ open: false, at: 0 });
  const list = `${id}-list`;
  const optionId = (index: number) => `${id}-option-${index}`;

  const take = (index: number) => {
    const option = options[index];
    if (option && option.value !== value) onChange(option.value);
    setState({ open: false, at: index });
  };
  const typeAhead = (event: React.KeyboardEvent) => {
    // Letters within a second of each other are one word.
    const { text, at } = typed.current;
    const word = event.timeStamp - at < 1000 ? text + event.key : event.key;
    typed.current = { text: word, at: event.timeStamp };
    const from = state.open ? state.at : chosen;
    const found = typedOption(
      word,
      options.map((option) => option.label),
      from,
    );
    if (found >= 0) setState({ open: true, at: found });
  };
  const press = (event: React.KeyboardEvent) => {
    const from = state.open ? state : { open: false, at: Math.max(chosen, 0) };
    const move = choiceMove(event, from, options.length);
    if (!move) {
      if (event.key.length === 1 && !event.ctrlKey && !event.metaKey) typeAhead(event);
      return;
    }
    if (move.consumed) {
      event.preventDefault();
      event.stopPropagation();
    }
    setState(move.state);
    if (move.take) take(move.state.at);
  };

  return (
    <View style={{ width }}>
      {!hideLabel && (
        <Text onPress={() => elementOf(box.current)?.focus()} style={styles.label}>
          <Words kind="label" nativeID={`${id}-label`}>
            {label}
          </Words>
        </Text>
      )}
      <View
        ref={box}
        role="combobox"
        tabIndex={0}
        aria-label={hideLabel ? label : undefined}
        aria-labelledby={hideLabel ? undefined : `${id}-label`}
        aria-describedby={(error ?? help) !== undefined ? `${id}-message` : undefined}
        aria-invalid={error !== undefined || undefined}
        aria-haspopup="listbox"
        aria-expanded={state.open}
        aria-controls={state.open ? list : undefined}
        aria-activedescendant={state.open ? optionId(state.at) : undefined}
        onKeyDown={press}
        onClick={() => setState({ open: !state.open, at: Math.max(chosen, 0) })}
        onBlur={() => setState({ ...state, open: false })}
        style={[
          styles.box,
          {
            backgroundColor: colours.page,
            borderColor: error === undefined ? colours.edge : colours.bad,
          },
          error !== undefined && styles.invalid,
        ]}
      >
        <View style={styles.value}>
          <Words numberOfLines={1}>{options[chosen]?.shown ?? options[chosen]?.label ?? ''}</Words>
        </View>
        <Icon name="chevron-down" />
      </View>
      {state.open && (
        <ChoiceList
          id={list}
          label={label}
          anchor={box}
          options={options}
          at={state.at}
          chosen={chosen}
          optionId={optionId}
          onTake={take}
        />
      )}
      {(error !== undefined || help !== undefined || !hideLabel) && (
        <FieldMessage id={`${id}-message`} help={help} error={error} />
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  label: { marginBottom: 6 },
  box: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space[2],
    height: 44,
    paddingHorizontal: space[3],
    borderWidth: 1,
    borderRadius: radius,
    cursor: 'pointer',
    userSelect: 'none',
  },
  // The 2 px border takes its extra px from the padding: nothing shifts.
  invalid: { borderWidth: 2, paddingHorizontal: space[3] - 1 },
  value: { flex: 1, minWidth: 0 },
});
