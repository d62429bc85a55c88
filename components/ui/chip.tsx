import { Pressable, StyleSheet, View } from 'react-native';
import { Icon, type IconName } from './icon';
import { radius, space, useTheme } from './theme';
import { softColour } from './web-style';
import { Words } from './words';

interface ChipProps {
  readonly label: string;
  /** Makes it a choice that can be on or off. */
  readonly onPress?: () => void;
  readonly chosen?: boolean;
  /** Makes it a state, with its icon. */
  readonly state?: 'good' | 'warn' | 'bad';
}

const stateIcons: Record<'good' | 'warn' | 'bad', IconName> = {
  good: 'check',
  warn: 'warning',
  bad: 'close',
};

/** A short word in a box: a choice, or the state of something. */
export function Chip({ label, onPress, chosen = false, state }: ChipProps) {
  const { colours } = useTheme();
  const tone = state ?? (chosen ? 'page' : 'ink');
  const backgroundColor = state ? colours[`${state}Wash`] : chosen ? colours.ink : colours.raised;
  const inside = (
    <>
      {state && <Icon name={stateIcons[state]} size={16} tone={tone} />}
      <Words kind="label" tone={tone} numberOfLines={1}>
        {label}
      </Words>
    </>
  );
  if (!onPress) return <View style={[styles.chip, { backgroundColor }]}>{inside}</View>;
  return (
    <Pressable
      role="button"
      aria-pressed={chosen}
      onPress={onPress}
      style={({ hovered }) => [
        styles.chip,
        styles.choice,
        softColour,
        { backgroundColor: hovered && !chosen ? colours.stone : backgroundColor },
      ]}
    >
      {inside}
    </Pressable>
  );
}

const styles = StyleSheet.create({
  chip: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space[1],
    minHeight: 28,
    paddingHorizontal: space[2],
    borderRadius: radius,
    alignSelf: 'flex-start',
  },
  choice: { minHeight: 36, paddingHorizontal: space[3] },
});
