import { useId, type ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { Icon } from './icon';
import { space, useTheme } from './theme';
import { useLayout } from './use-layout';
import { softColour } from './web-style';
import { Words } from './words';

interface CheckboxProps {
  readonly label: string;
  readonly checked: boolean;
  readonly onChange: (checked: boolean) => void;
  /** Stands at the right: a symbol, a reason. */
  readonly note?: ReactNode;
  /** Stands under the label. */
  readonly help?: string;
  readonly disabled?: boolean;
}

/** Something that is on or off; the whole row is the target. */
export function Checkbox({
  label,
  checked,
  onChange,
  note,
  help,
  disabled = false,
}: CheckboxProps) {
  const { colours } = useTheme();
  const { rail } = useLayout();
  const id = useId();
  const tone = disabled ? 'inkSoft' : 'ink';
  return (
    <Pressable
      role="checkbox"
      aria-checked={checked}
      aria-labelledby={help === undefined ? undefined : `${id}-label`}
      aria-describedby={help === undefined ? undefined : `${id}-help`}
      disabled={disabled}
      onPress={() => onChange(!checked)}
      // react-native-web presses by Space only where the role is button.
      onKeyDown={(event) => {
        if (event.key !== ' ') return;
        event.preventDefault();
        onChange(!checked);
      }}
      style={[styles.row, { minHeight: rail ? 32 : 44 }]}
    >
      <View
        style={[
          styles.box,
          softColour,
          {
            backgroundColor: checked && !disabled ? colours.well : 'transparent',
            borderColor: disabled ? colours.rule : checked ? colours.well : colours.edge,
          },
        ]}
      >
        {checked && <Icon name="check" size={16} tone={disabled ? 'inkSoft' : 'onWell'} />}
      </View>
      <View style={styles.label}>
        <Words tone={tone} nativeID={`${id}-label`}>
          {label}
        </Words>
        {help !== undefined && (
          <Words kind="help" nativeID={`${id}-help`}>
            {help}
          </Words>
        )}
      </View>
      {typeof note === 'string' ? <Words kind="help">{note}</Words> : note}
    </Pressable>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', gap: space[2] },
  box: {
    width: 20,
    height: 20,
    borderWidth: 1,
    borderRadius: 4,
    alignItems: 'center',
    justifyContent: 'center',
  },
  label: { flex: 1 },
});
