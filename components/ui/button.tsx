import { useId, type Ref } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { Icon, type IconName } from './icon';
import { radius, space, useTheme, type Colours } from './theme';
import { softColour } from './web-style';
import { Words } from './words';

export interface ButtonProps {
  readonly label: string;
  readonly onPress: () => void;
  /** One `primary` a screen; `destructive` only behind a confirmation. */
  readonly kind?: 'primary' | 'plain' | 'destructive' | 'quiet';
  /** `main` for a phone's main actions; `small` only on a wide screen. */
  readonly size?: 'regular' | 'main' | 'small';
  readonly icon?: IconName;
  /** Shows the icon alone; the label is still what screen readers say. */
  readonly hideLabel?: boolean;
  /** Said after the label, where several buttons on screen share it: what this one is about. */
  readonly about?: string;
  readonly disabled?: boolean;
  /** Why the button is disabled, shown below it. */
  readonly why?: string;
  readonly expanded?: boolean;
  /** Id of what the button opens. */
  readonly controls?: string;
  /** Takes the room its row leaves. */
  readonly grow?: boolean;
  readonly ref?: Ref<View>;
}

/** Something that can be done. */
export function Button({
  label,
  onPress,
  kind = 'plain',
  size = 'regular',
  icon,
  hideLabel = false,
  about,
  disabled = false,
  why,
  expanded,
  controls,
  grow = false,
  ref,
}: ButtonProps) {
  const { colours } = useTheme();
  const whyId = useId();
  const showsWhy = disabled && why !== undefined;
  const tone = disabled ? 'inkSoft' : tones[kind];
  return (
    <View style={grow && styles.grow}>
      <Pressable
        ref={ref}
        role="button"
        aria-label={hideLabel || about !== undefined ? spoken(label, about) : undefined}
        aria-expanded={expanded}
        aria-controls={controls}
        aria-describedby={showsWhy ? whyId : undefined}
        disabled={disabled}
        onPress={onPress}
        style={({ hovered, pressed }) => [
          styles.button,
          styles[size],
          hideLabel && { width: heights[size], paddingHorizontal: 0 },
          kind === 'quiet' && !hideLabel && styles.quiet,
          softColour,
          surface(colours, disabled ? 'disabled' : kind, hovered, pressed),
        ]}
      >
        {icon && <Icon name={icon} size={size === 'small' ? 16 : 20} tone={tone} />}
        {!hideLabel && (
          <Words kind={size === 'small' ? 'label' : 'button'} tone={tone} numberOfLines={1}>
            {label}
          </Words>
        )}
      </Pressable>
      {showsWhy && (
        <View style={styles.why}>
          <Words kind="help" nativeID={whyId}>
            {why}
          </Words>
        </View>
      )}
    </View>
  );
}

const spoken = (label: string, about = '') => `${label} ${about}`.trim();

const tones = { primary: 'onWell', plain: 'ink', destructive: 'bad', quiet: 'well' } as const;
const heights = { regular: 44, main: 52, small: 36 } as const;

type Surface = NonNullable<ButtonProps['kind']> | 'disabled';

function surface(colours: Colours, kind: Surface, hovered: boolean, pressed: boolean) {
  const active = pressed ? colours.stone : hovered ? colours.raised : 'transparent';
  switch (kind) {
    case 'disabled':
      return { backgroundColor: colours.raised, borderColor: colours.rule };
    case 'primary':
      return {
        backgroundColor: colours.well,
        borderColor: pressed || hovered ? colours.ink : colours.well,
      };
    case 'plain':
      return { backgroundColor: active, borderColor: colours.edge };
    case 'destructive':
      return {
        backgroundColor: pressed || hovered ? colours.badWash : 'transparent',
        borderColor: colours.bad,
      };
    case 'quiet':
      return { backgroundColor: active, borderColor: 'transparent' };
  }
}

const styles = StyleSheet.create({
  button: {
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: space[2],
    borderWidth: 1,
    borderRadius: radius,
  },
  regular: { minHeight: heights.regular, paddingHorizontal: space[4] },
  main: { minHeight: heights.main, paddingHorizontal: space[4] },
  small: { minHeight: heights.small, paddingHorizontal: space[3] },
  // Its word, not its invisible border, stands on the column's edge.
  quiet: { paddingHorizontal: space[1], marginHorizontal: -space[1] - 1 },
  grow: { flexGrow: 1, flexShrink: 1 },
  why: { marginTop: space[1] },
});
