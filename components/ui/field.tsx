import { useId, useRef, type ReactNode, type Ref } from 'react';
import {
  StyleSheet,
  Text,
  TextInput,
  View,
  type DimensionValue,
  type InputModeOptions,
  type TextInputProps,
} from 'react-native';
import { FieldMessage } from './field-message';
import { fonts, radius, space, useTheme } from './theme';
import { Words } from './words';

/** What a field tells of a key: enough to act on it and to keep it from the input. */
export interface FieldKey {
  readonly key: string;
  readonly shiftKey: boolean;
  readonly altKey: boolean;
  readonly preventDefault: () => void;
}

/** The list that typing opens: the field is then a combobox after the WAI-ARIA practices. */
interface FieldListbox {
  readonly id: string;
  readonly open: boolean;
  /** Id of the option that the keys are at. */
  readonly at: string | undefined;
}

interface FieldProps {
  readonly label: string;
  readonly value: string;
  readonly onChangeText: (text: string) => void;
  /** Shown inside, at the right. */
  readonly unit?: string;
  /** Shown inside, at the left. */
  readonly lead?: string;
  /** A button of 44 px inside, at the right, where no unit is. */
  readonly trailing?: ReactNode;
  /** Shows dots in place of what is typed. */
  readonly secret?: boolean;
  readonly help?: string;
  /** What is wrong and the right form; takes the place of the help. */
  readonly error?: string;
  readonly onSubmit?: () => void;
  readonly onBlur?: () => void;
  readonly onKeyDown?: (key: FieldKey) => void;
  /** `words` for names and addresses; numbers, formulas and keys are set in numerals. */
  readonly kind?: 'numerals' | 'words';
  readonly size?: 'regular' | 'main';
  readonly inputMode?: InputModeOptions;
  /** The label is then only said, and no room is kept for a message. */
  readonly hideLabel?: boolean;
  readonly listbox?: FieldListbox;
  /** What is there is taken as a whole: typing replaces it. */
  readonly selectOnFocus?: boolean;
  readonly autoComplete?: TextInputProps['autoComplete'];
  readonly width?: DimensionValue;
  readonly ref?: Ref<TextInput>;
}

/** One line to type in, with its label, its unit, and what is wrong with it. */
export function Field({
  label,
  value,
  onChangeText,
  unit,
  lead,
  trailing,
  secret = false,
  help,
  error,
  onSubmit,
  onBlur,
  onKeyDown,
  kind = 'numerals',
  size = 'regular',
  inputMode,
  hideLabel = false,
  listbox,
  selectOnFocus = false,
  autoComplete = 'off',
  width,
  ref,
}: FieldProps) {
  const { colours } = useTheme();
  const id = useId();
  const own = useRef<TextInput>(null);
  const ids = { label: `${id}-label`, unit: `${id}-unit`, message: `${id}-message` };
  const invalid = error !== undefined;
  const described = [unit && ids.unit, (invalid || help) && ids.message].filter(Boolean).join(' ');
  return (
    <View style={[styles.field, { width }]}>
      {!hideLabel && (
        <Text onPress={() => own.current?.focus()} style={styles.label}>
          <Words kind="label" nativeID={ids.label}>
            {label}
          </Words>
        </Text>
      )}
      <View>
        <TextInput
          ref={(input: TextInput | null) => {
            own.current = input;
            if (typeof ref === 'function') ref(input);
            else if (ref) ref.current = input;
          }}
          value={value}
          onChangeText={onChangeText}
          onSubmitEditing={onSubmit}
          onBlur={onBlur}
          onKeyPress={onKeyDown && ((event) => onKeyDown(event as unknown as FieldKey))}
          // The field keeps the focus after Enter, so that the next value can be typed at once.
          blurOnSubmit={false}
          // Also where the label stands over it: in a sheet it may be scrolled out of sight.
          aria-label={label}
          aria-labelledby={hideLabel ? undefined : ids.label}
          aria-describedby={described || undefined}
          aria-invalid={invalid || undefined}
          {...(listbox && comboboxProps(listbox))}
          selectTextOnFocus={selectOnFocus}
          secureTextEntry={secret}
          inputMode={inputMode}
          autoComplete={autoComplete}
          autoCapitalize="none"
          autoCorrect={false}
          style={[
            styles.input,
            styles[size],
            { fontFamily: fonts[kind === 'words' ? 'words' : 'numbers'] },
            {
              color: colours.ink,
              backgroundColor: colours.page,
              borderColor: invalid ? colours.bad : colours.edge,
              paddingLeft: room(lead, invalid),
              paddingRight: trailing === undefined ? room(unit, invalid) : height,
            },
            invalid && styles.invalid,
          ]}
        />
        {lead !== undefined && (
          <View style={[styles.inside, styles.lead]}>
            <Words kind="button">{lead}</Words>
          </View>
        )}
        {trailing !== undefined && <View style={styles.trailing}>{trailing}</View>}
        {unit !== undefined && (
          <View style={[styles.inside, styles.unit]}>
            <Words tone="inkSoft" nativeID={ids.unit}>
              {unit}
            </Words>
          </View>
        )}
      </View>
      {(invalid || help !== undefined || !hideLabel) && (
        <FieldMessage id={ids.message} help={help} error={error} />
      )}
    </View>
  );
}

const comboboxProps = ({ id, open, at }: FieldListbox) =>
  ({
    role: 'combobox',
    'aria-autocomplete': 'list',
    'aria-haspopup': 'listbox',
    'aria-expanded': open,
    'aria-controls': open ? id : undefined,
    'aria-activedescendant': open ? at : undefined,
  }) as const;

/** Padding beside a text inside the field; a 2 px border takes its extra px from the padding. */
const room = (inside: string | undefined, invalid: boolean) =>
  (inside === undefined ? space[3] : space[5] + inside.length * 8) - (invalid ? 1 : 0);

const height = 44;

const styles = StyleSheet.create({
  field: { minWidth: 0 },
  label: { marginBottom: 6, cursor: 'pointer' },
  input: { borderWidth: 1, borderRadius: radius, fontSize: 15, width: '100%' },
  regular: { height },
  main: { height: 52, fontSize: 24, fontWeight: '500' },
  invalid: { borderWidth: 2 },
  inside: {
    position: 'absolute',
    top: 0,
    bottom: 0,
    justifyContent: 'center',
    pointerEvents: 'none',
  },
  lead: { left: space[3] },
  unit: { right: space[3] },
  trailing: { position: 'absolute', top: 0, right: 0 },
});
